import type { Head } from '../../shared/job/plan';
import { useSay } from './say';

/** Prints a casing head's dimensions as its drawing has them: name and value, in the order in which they are looked for. */
export function useHeadNumbers(): (head: Head) => { name: string; value: string }[] {
  const { say, quantity } = useSay();
  const inches = (value: string): string => quantity(value, 'in');

  const seals = ({ seals: count, sealRatedPsi, sealRatedF }: Head): string => {
    if (count === 0) return say('plan.head.noSeal');
    const unrated = say('plan.head.unrated');
    return say('plan.head.sealsAre', {
      count,
      psi: sealRatedPsi === null ? unrated : quantity(String(sealRatedPsi), 'psi'),
      temperature: sealRatedF === null ? unrated : quantity(sealRatedF, 'degF'),
    });
  };

  return (head) => {
    const named = (key: string, value: string) => ({ name: say(`plan.head.${key}`), value });
    const rating = quantity(String(head.ratedPressurePsi), 'psi');
    return [
      named('flange', say('plan.head.flangeIs', { size: head.nominalSize, rating })),
      named('casing', inches(head.casingOdIn)),
      named('faceToShoulder', inches(head.faceToShoulderIn)),
      named('faceToOutlet', inches(head.faceToOutletIn)),
      named('overall', inches(head.overallHeightIn)),
      named('socket', inches(head.socketDepthIn)),
      named('bore', inches(head.socketBoreIn)),
      named('welds', say(`plan.head.weldsAre.${head.welds}`)),
      named('ports', String(head.ports)),
      named('seals', seals(head)),
    ];
  };
}
