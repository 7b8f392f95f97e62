import type { Command } from '../../shared/contracts/commands';
import type { Times } from '../../shared/job/actor';

/**
 * The three times of a command. What the device says of its offset is kept as it is: a command may have waited for hours,
 * so its arrival says nothing about the clock that it was made under.
 */
export function commandTimes({ deviceAt, offsetMs, doubtMs }: Command['clock'], received: Date): Times {
  const device = Date.parse(deviceAt);
  return {
    device: new Date(device).toISOString(),
    corrected: new Date(device + (offsetMs ?? 0)).toISOString(),
    received: received.toISOString(),
    doubtMs: offsetMs === null ? null : doubtMs,
  };
}
