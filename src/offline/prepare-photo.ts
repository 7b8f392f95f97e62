import { heicSizeOf } from '../../shared/photos/heic-size';
import { MAX_PHOTO_BYTES, MAX_PHOTO_PIXELS, type PhotoType } from '../../shared/photos/limits';
import type { PhotoRefusal } from '../../shared/photos/refusals';
import { photoTypeOf, SIGNATURE_BYTES } from '../../shared/photos/type-by-content';
import { hashBytes } from './hash-file';
import { makePreview, type Preview } from './make-preview';

/** A photo ready for the outbox: the camera's own bytes under their hash, and what can be shown of them. */
export interface PreparedPhoto {
  original: Blob;
  sha256: string;
  type: PhotoType;
  bytes: number;
  /** Of the upright picture, in pixels. */
  width: number;
  height: number;
  /** Missing where this browser cannot decode the photo (HEIC in most); say `photos.prepare.noPreview` then. */
  preview?: Preview;
}

/** The camera's own bytes, named and safe to keep; nothing has been decoded yet. */
export type TakenPhoto = Pick<PreparedPhoto, 'original' | 'sha256' | 'type' | 'bytes'>;

type Refused = { ok: false; code: PhotoRefusal };
export type TakePhotoResult = { ok: true; taken: TakenPhoto } | Refused;
export type PreparePhotoResult = { ok: true; photo: PreparedPhoto } | Refused;

/**
 * The first step: takes a file's bytes over and names them by their hash. What it answers can be put into the outbox
 * before the preview is drawn, which takes longer. What the server would turn away by size or kind is refused here.
 */
export async function takePhoto(file: Blob): Promise<TakePhotoResult> {
  if (file.size === 0) return refuse('photo.empty');
  if (file.size > MAX_PHOTO_BYTES) return refuse('photo.too-large');
  // A file of the gallery can vanish or change until it is sent: its bytes are taken over now.
  const bytes = await file.arrayBuffer().catch(() => null);
  if (!bytes) return refuse('photo.unreadable');
  const type = photoTypeOf(new Uint8Array(bytes, 0, Math.min(bytes.byteLength, SIGNATURE_BYTES)));
  if (!type) return refuse('photo.not-an-image');
  const sha256 = await hashBytes(bytes);
  return { ok: true, taken: { original: new Blob([bytes], { type }), sha256, type, bytes: bytes.byteLength } };
}

/** The second step: finds the upright size and draws the preview. */
export async function measurePhoto(taken: TakenPhoto): Promise<PreparePhotoResult> {
  const shown = await makePreview(taken.original);
  const size = shown ?? (taken.type === 'image/heic' ? await statedSize(taken.original) : null);
  if (!size) return refuse('photo.truncated');
  const { width, height } = size;
  if (width * height > MAX_PHOTO_PIXELS) return refuse('photo.too-many-pixels');
  const photo = { ...taken, width, height };
  return { ok: true, photo: shown ? { ...photo, preview: shown.preview } : photo };
}

/** Both steps: a file from the camera or the gallery becomes a photo ready for the outbox. The original is never changed. */
export async function preparePhoto(file: Blob): Promise<PreparePhotoResult> {
  const result = await takePhoto(file);
  return result.ok ? measurePhoto(result.taken) : result;
}

async function statedSize(original: Blob): Promise<{ width: number; height: number } | null> {
  return heicSizeOf(new Uint8Array(await original.arrayBuffer()));
}

function refuse(code: PhotoRefusal): Refused {
  return { ok: false, code };
}
