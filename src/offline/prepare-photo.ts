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

export type PreparePhotoResult = { ok: true; photo: PreparedPhoto } | { ok: false; code: PhotoRefusal };

/**
 * Takes a file from the camera or the gallery. The original is hashed first and never changed; what the server would
 * turn away for its size or its kind is refused here, before it waits in the outbox.
 */
export async function preparePhoto(file: Blob): Promise<PreparePhotoResult> {
  if (file.size === 0) return refuse('photo.empty');
  if (file.size > MAX_PHOTO_BYTES) return refuse('photo.too-large');
  // A file of the gallery can vanish or change until it is sent: its bytes are taken over now.
  const bytes = await file.arrayBuffer().catch(() => null);
  if (!bytes) return refuse('photo.unreadable');
  const type = photoTypeOf(new Uint8Array(bytes, 0, Math.min(bytes.byteLength, SIGNATURE_BYTES)));
  if (!type) return refuse('photo.not-an-image');
  const sha256 = await hashBytes(bytes);
  const original = new Blob([bytes], { type });
  const shown = await makePreview(original);
  const size = shown ?? (type === 'image/heic' ? heicSizeOf(new Uint8Array(bytes)) : null);
  if (!size) return refuse('photo.truncated');
  const { width, height } = size;
  if (width * height > MAX_PHOTO_PIXELS) return refuse('photo.too-many-pixels');
  const photo = { original, sha256, type, bytes: bytes.byteLength, width, height };
  return { ok: true, photo: shown ? { ...photo, preview: shown.preview } : photo };
}

function refuse(code: PhotoRefusal): PreparePhotoResult {
  return { ok: false, code };
}
