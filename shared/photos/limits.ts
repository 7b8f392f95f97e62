/** Largest photo that is taken, in bytes (15 MB, decimal as phones show it). */
export const MAX_PHOTO_BYTES = 15_000_000;

/** Largest photo that is taken, in pixels of its header: what unpacks to more is a bomb, or no phone's picture. */
export const MAX_PHOTO_PIXELS = 60_000_000;

/** Largest pressure recorder file, in bytes: a second's samples over a day stay far below. */
export const MAX_RECORDER_BYTES = 5_000_000;

/** Longest side of the preview that the browser makes beside the original, in pixels. */
export const PREVIEW_LONGEST_SIDE = 1280;

/** The kinds of photo that are taken, by their content type. */
export const PHOTO_TYPES = ['image/jpeg', 'image/png', 'image/webp', 'image/heic'] as const;
export type PhotoType = (typeof PHOTO_TYPES)[number];

/** The content type under which a recorder's file is sent and read again. */
export const RECORDER_TYPE = 'text/csv';

/** Everything that can lie among a job's files. */
export const FILE_TYPES = [...PHOTO_TYPES, RECORDER_TYPE] as const;
export type FileType = (typeof FILE_TYPES)[number];

/** What a file is sent as: a photo of a hold point, or the samples of a pressure recorder. */
export type FileKind = 'photo' | 'recorder';

/** The byte limit for a kind of file. */
export function byteLimitOf(kind: FileKind): number {
  return kind === 'photo' ? MAX_PHOTO_BYTES : MAX_RECORDER_BYTES;
}
