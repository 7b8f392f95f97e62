/** Why a photo is not taken. Each has its sentence in the locale file `file-refusals`, area `errors`. */
export const PHOTO_REFUSALS = [
  'photo.empty',
  'photo.unreadable',
  'photo.too-large',
  'photo.not-an-image',
  'photo.truncated',
  'photo.no-size',
  'photo.too-many-pixels',
  'photo.polyglot',
] as const;
export type PhotoRefusal = (typeof PHOTO_REFUSALS)[number];

/** Why a recorder's file is not taken. */
export const RECORDER_REFUSALS = [
  'recorder.empty',
  'recorder.too-large',
  'recorder.not-text',
  'recorder.not-a-table',
] as const;
export type RecorderRefusal = (typeof RECORDER_REFUSALS)[number];

/** Why the sending of a file failed, whatever is in it. */
export const TRANSFER_REFUSALS = ['file.hash-mismatch', 'file.incomplete'] as const;
export type TransferRefusal = (typeof TRANSFER_REFUSALS)[number];

export type FileRefusal = PhotoRefusal | RecorderRefusal | TransferRefusal;

/** The message key of a refusal: `photo.too-large` → `errors.photo.too-large`. */
export function refusalMessageKey(code: FileRefusal): string {
  return `errors.${code}`;
}
