import { PREVIEW_LONGEST_SIDE } from './limits';

/** The size of a photo's preview, in pixels: longest side 1280, never larger than the photo, never less than one. */
export function previewSizeOf(photo: { width: number; height: number }): { width: number; height: number } {
  const scale = Math.min(1, PREVIEW_LONGEST_SIDE / Math.max(photo.width, photo.height));
  return {
    width: Math.max(1, Math.round(photo.width * scale)),
    height: Math.max(1, Math.round(photo.height * scale)),
  };
}
