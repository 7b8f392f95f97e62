import type { Verdict } from '../../../shared/hold-points/verdict';
import type { Chapter } from '../../../shared/job/story';

/** The one reading that a verdict is shown beside; null where it rests on several, or on none. */
export const fieldUnder = ({ review }: Chapter, { about }: Verdict): string | null => {
  const read = about.filter((field) => review.context.read(field) !== undefined);
  return read.length === 1 ? (read[0] ?? null) : null;
};
