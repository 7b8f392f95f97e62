import type { Driver } from '../../server/demo/scenario/walk-point';
import { aPhoto } from './clearance';
import type { TestJob } from './a-job';

/** Carries the scenario's commands to a job in memory. */
export const drive = (job: TestJob): Driver => {
  let pictures = 0;
  return {
    state: async () => job.job,
    now: () => job.now,
    advance: (minutes) => void job.minutes(minutes),
    give: async (type, body, role) => void job.do(type, body, job.person(role)),
    photograph: async (_point, shot) => {
      const { shot: _shot, ...photo } = aPhoto(shot, ++pictures);
      return photo;
    },
    signing: async (point) => job.signing(point),
  };
};
