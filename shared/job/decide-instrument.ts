import { accept, event, refuse, type Decider } from './decision';

/** As many as a plan holds. */
const most = 40;

/**
 * An instrument joins a job that runs: when the only gas meter fails nothing could be lit again. One that is out of
 * calibration may be listed; its readings are judged on the day they are taken.
 */
export const decideAddInstrument: Decider<'add-instrument'> = (input) => {
  const { instrument } = input.command.body;
  const { instruments } = input.state.plan;
  if (instruments.some((one) => one.id === instrument.id))
    return refuse('instrument-already-listed', { params: { name: instrument.name } });
  if (instruments.length >= most) return refuse('instruments-full', { params: { most } });
  return accept(event(input, 'instrument-added', { instrument }));
};
