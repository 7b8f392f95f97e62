import { previewSizeOf } from '../../shared/photos/preview-size';
import { hashFile } from './hash-file';

/** A smaller JPEG of a photo, for lists and slow links; signed along by its own hash. */
export interface Preview {
  blob: Blob;
  sha256: string;
  width: number;
  height: number;
}

/** Of a file to be shown beside its original, in the same position as a person holds it. */
export interface Shown {
  width: number;
  height: number;
  preview: Preview;
}

const QUALITY = 0.8;

/** Decodes a photo upright and draws its preview; null when this browser cannot decode it. */
export async function makePreview(original: Blob): Promise<Shown | null> {
  const bitmap = await createImageBitmap(original, { imageOrientation: 'from-image' }).catch(() => null);
  if (!bitmap) return null;
  try {
    const { width, height } = bitmap;
    const size = previewSizeOf({ width, height });
    const blob = await draw(bitmap, size.width, size.height);
    return blob && { width, height, preview: { blob, sha256: await hashFile(blob), ...size } };
  } finally {
    bitmap.close();
  }
}

async function draw(bitmap: ImageBitmap, width: number, height: number): Promise<Blob | null> {
  if (typeof OffscreenCanvas !== 'undefined') {
    const canvas = new OffscreenCanvas(width, height);
    paint(canvas.getContext('2d'), bitmap, width, height);
    return canvas.convertToBlob({ type: 'image/jpeg', quality: QUALITY });
  }
  const canvas = Object.assign(document.createElement('canvas'), { width, height });
  paint(canvas.getContext('2d'), bitmap, width, height);
  return new Promise((done) => canvas.toBlob(done, 'image/jpeg', QUALITY));
}

type Pen = CanvasRenderingContext2D | OffscreenCanvasRenderingContext2D | null;

/** JPEG knows no transparency: what a PNG leaves open becomes paper, not black. */
function paint(pen: Pen, bitmap: ImageBitmap, width: number, height: number): void {
  if (!pen) return;
  pen.fillStyle = 'white';
  pen.fillRect(0, 0, width, height);
  pen.imageSmoothingQuality = 'high';
  pen.drawImage(bitmap, 0, 0, width, height);
}
