import type { Command } from '../../shared/contracts/commands';
import type { Times } from '../../shared/job/actor';

/** The three times of a command that has not arrived yet, worked out as the server will. */
export function timesOf({ deviceAt, offsetMs, doubtMs }: Command['clock']): Times {
  const corrected = new Date(Date.parse(deviceAt) + (offsetMs ?? 0)).toISOString();
  return {
    device: new Date(Date.parse(deviceAt)).toISOString(),
    corrected,
    received: null,
    doubtMs: offsetMs === null ? null : doubtMs,
  };
}
