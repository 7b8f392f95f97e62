import type { Role } from '../permissions/roles';

/** Who acts, as it is printed in the record. `role` is the role used for this act. */
export interface ActorStamp {
  accountId: string;
  name: string;
  role: Role;
}

/** Somebody who measured: a person with an account, or a hand named in words. */
export interface PersonRef {
  accountId: string | null;
  name: string;
}

/** The three times of a command, ISO 8601 in UTC; `received` is null while it waits on the device. */
export interface Times {
  device: string;
  /** device time moved by the last measured offset; the device's own when no offset is known */
  corrected: string;
  received: string | null;
  /** how far the corrected time may be off; null when the offset is unknown */
  doubtMs: number | null;
}

/** What a device knew of the time when a command was made. */
interface DeviceClock {
  deviceAt: string;
  offsetMs: number | null;
  doubtMs: number | null;
}

/**
 * The three times of a command. A command may have waited for hours, so that its arrival says nothing about the clock
 * that it was made under, with one exception: nothing arrives before it was made, and by how much it seems to is doubt.
 */
export const timesOf = ({ deviceAt, offsetMs, doubtMs }: DeviceClock, received: string | null): Times => {
  const device = Date.parse(deviceAt);
  const corrected = device + (offsetMs ?? 0);
  const early = received === null ? 0 : corrected - Date.parse(received);
  return {
    device: new Date(device).toISOString(),
    corrected: new Date(corrected).toISOString(),
    received,
    doubtMs: offsetMs === null || doubtMs === null ? null : Math.max(doubtMs, early),
  };
};

/** More doubt than this about the clock is a hold, on gas a stop (architecture, Time). */
export const clockDoubtLimitMs = 120_000;

export const clockIsDoubtful = (times: Times): boolean => times.doubtMs === null || times.doubtMs > clockDoubtLimitMs;

/** The same hand: by account when both have one, by name otherwise. */
export const samePerson = (a: PersonRef, b: PersonRef): boolean =>
  a.accountId !== null && b.accountId !== null
    ? a.accountId === b.accountId
    : a.name.trim().toLowerCase() === b.name.trim().toLowerCase();

/** Minutes from one instant to a later one. */
export const minutesBetween = (from: string, to: string): number => (Date.parse(to) - Date.parse(from)) / 60_000;
