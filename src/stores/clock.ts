import { defineStore } from 'pinia';
import { ref } from 'vue';
import type { readClock } from '../../shared/contracts/clock';
import type { ResponseOf } from '../../shared/contracts/contract';
import { ask } from '../api/client';
import { keepObject, keptObject } from './kept';

/** A measurement of this device's clock against the server's. */
interface Measured {
  /** server minus device, milliseconds */
  readonly offsetMs: number;
  /** half the round trip: how far the offset may be off, milliseconds */
  readonly doubtMs: number;
  /** when it was measured, by the device's own clock */
  readonly deviceAt: string;
}

/** The device's part of a command's three times. Both numbers are null while the offset was never measured. */
export interface DeviceStamp {
  readonly deviceAt: string;
  readonly offsetMs: number | null;
  readonly doubtMs: number | null;
}

/** How much a phone's clock may drift after a measurement: 50 parts in a million (common practice for its crystal). */
const DRIFT = 50e-6;

const isMeasured = (value: unknown): value is Measured =>
  typeof value === 'object' &&
  value !== null &&
  'offsetMs' in value &&
  Number.isInteger(value.offsetMs) &&
  'doubtMs' in value &&
  Number.isInteger(value.doubtMs) &&
  'deviceAt' in value &&
  typeof value.deviceAt === 'string';

/**
 * How far this device's clock is from the server's. Measured at start, when the app comes back into view and when the
 * link returns; the last measurement outlives a reload, so that commands captured without a signal carry it.
 */
export const useClockStore = defineStore('clock', () => {
  const last = ref(keptObject('clock', isMeasured));
  let measuring: Promise<void> | undefined;
  let keeping = false;

  function measure(): Promise<void> {
    measuring ??= measureOnce().finally(() => (measuring = undefined));
    return measuring;
  }

  async function measureOnce(): Promise<void> {
    const before = Date.now();
    const started = performance.now();
    const answer = await ask<ResponseOf<typeof readClock>>('GET', '/api/clock', { expects401: true });
    const roundTrip = performance.now() - started;
    if (!answer.ok) return;
    const server = Date.parse(answer.value.now);
    if (Number.isNaN(server)) return;
    last.value = {
      offsetMs: Math.round(server - (before + roundTrip / 2)),
      doubtMs: Math.ceil(roundTrip / 2),
      deviceAt: new Date().toISOString(),
    };
    keepObject('clock', last.value);
  }

  /** The stamp for an act done now; doubt grows with the age of the measurement. */
  function stamp(): DeviceStamp {
    const now = new Date();
    if (last.value === undefined) return { deviceAt: now.toISOString(), offsetMs: null, doubtMs: null };
    const age = Math.abs(now.getTime() - Date.parse(last.value.deviceAt));
    return {
      deviceAt: now.toISOString(),
      offsetMs: last.value.offsetMs,
      doubtMs: last.value.doubtMs + Math.ceil(age * DRIFT),
    };
  }

  /** Now, as the server would say it: for ages on the screen. */
  function correctedNow(): Date {
    return new Date(Date.now() + (last.value?.offsetMs ?? 0));
  }

  /** Keeps measuring whenever it is worth it; nothing runs while the app is hidden. */
  function keepMeasuring(): void {
    void measure();
    if (keeping) return;
    keeping = true;
    addEventListener('online', () => void measure());
    document.addEventListener('visibilitychange', () => {
      if (document.visibilityState === 'visible') void measure();
    });
  }

  return { last, measure, stamp, correctedNow, keepMeasuring };
});
