import { fileTypeFromBuffer } from 'file-type';
import { imageSize } from 'image-size';
import { MAX_PHOTO_BYTES, MAX_PHOTO_PIXELS, type PhotoType } from '../../shared/photos/limits';
import type { PhotoRefusal } from '../../shared/photos/refusals';
import { photoTypeOf, SIGNATURE_BYTES } from '../../shared/photos/type-by-content';
import { hasForeignContent } from './image-formats/foreign-content';
import { walkHeic } from './image-formats/heic';
import { walkJpeg } from './image-formats/jpeg';
import { walkPng } from './image-formats/png';
import { readExif } from './image-formats/read-exif';
import type { ImageStructure, PixelSize, StructureResult } from './image-formats/structure';
import { walkWebp } from './image-formats/webp';

/** What a photo says of itself. Width and height are those of the upright picture, in pixels. */
export interface ImageFacts {
  type: PhotoType;
  width: number;
  height: number;
  /** EXIF's orientation, 1 to 8; 1 where nothing is said. */
  orientation: number;
  /** The camera's own time as it wrote it, if any. */
  takenAt?: string;
}

export type ImageVerdict = { ok: true; image: ImageFacts } | { ok: false; code: PhotoRefusal };

const WALKS: Record<PhotoType, (bytes: Buffer) => StructureResult> = {
  'image/jpeg': walkJpeg,
  'image/png': walkPng,
  'image/webp': walkWebp,
  'image/heic': walkHeic,
};
const HEIC_NAMES = ['image/heic', 'image/heif'];

/**
 * Judges a photo by its bytes: kind, stated size, completeness, and whether it is something else as well.
 * No pixel is ever decoded, so nothing can unpack.
 */
export async function inspectImage(bytes: Buffer): Promise<ImageVerdict> {
  if (bytes.length === 0) return refuse('photo.empty');
  if (bytes.length > MAX_PHOTO_BYTES) return refuse('photo.too-large');
  const type = await typeOf(bytes);
  if (!type) return refuse('photo.not-an-image');
  // The size comes first, from the header alone: a bomb is named as such even when the rest of it is missing.
  const early = quickSize(bytes);
  const tooBig = early && sizeRefusal([early]);
  if (tooBig) return refuse(tooBig);
  const structure = WALKS[type](bytes);
  if (typeof structure === 'string') return refuse(explain(structure, bytes));
  const bad = sizeRefusal(structure.sizes);
  if (bad) return refuse(bad);
  if (hasForeignContent(bytes, structure.end, structure.texts)) return refuse('photo.polyglot');
  if (!mayBeFollowed(type, bytes, structure.end)) return refuse('photo.polyglot');
  const size = agreedSize(type, bytes, structure);
  if (!size) return refuse('photo.truncated');
  return { ok: true, image: await describe(type, size, structure) };
}

/** Two readers must name the same kind. */
async function typeOf(bytes: Buffer): Promise<PhotoType | null> {
  const own = photoTypeOf(bytes.subarray(0, SIGNATURE_BYTES));
  if (!own) return null;
  const other = (await fileTypeFromBuffer(bytes.subarray(0, 4100)).catch(() => undefined))?.mime;
  // A header cut short leaves the second reader without an answer: the walk will say what is missing.
  if (other === undefined || other === own) return own;
  if (own === 'image/heic' && HEIC_NAMES.includes(other)) return own;
  return null;
}

/** The size as the first kilobytes state it, or null while they do not. */
function quickSize(bytes: Buffer): PixelSize | null {
  try {
    return imageSize(new Uint8Array(bytes.subarray(0, 65_536)));
  } catch {
    return null;
  }
}

function sizeRefusal(sizes: readonly PixelSize[]): PhotoRefusal | null {
  if (sizes.some(({ width, height }) => width * height > MAX_PHOTO_PIXELS)) return 'photo.too-many-pixels';
  if (sizes.some(({ width, height }) => width < 1 || height < 1)) return 'photo.no-size';
  return null;
}

/** A file whose structure breaks off because something else is glued to it is called by that name. */
function explain(code: PhotoRefusal, bytes: Buffer): PhotoRefusal {
  if (code !== 'photo.truncated') return code;
  return hasForeignContent(bytes, bytes.length, []) ? 'photo.polyglot' : code;
}

/** Phones append to JPEG alone; a lone zero at the end of a WebP is its padding. */
function mayBeFollowed(type: PhotoType, bytes: Buffer, end: number): boolean {
  if (type === 'image/jpeg' || end === bytes.length) return true;
  return type === 'image/webp' && end + 1 === bytes.length && bytes[end] === 0;
}

/** The size that the walk and the second reader both see, or null when they differ. */
function agreedSize(type: PhotoType, bytes: Buffer, structure: ImageStructure): PixelSize | null {
  const [largest] = [...structure.sizes].sort((a, b) => b.width * b.height - a.width * a.height);
  // The second reader is off by a pixel where a HEIC names its clean aperture, and blind behind fill bytes.
  const seen = type === 'image/heic' ? null : headerSize(bytes, structure);
  if (!largest || !seen) return largest ?? null;
  return seen.width === largest.width && seen.height === largest.height ? largest : null;
}

function headerSize(bytes: Buffer, structure: ImageStructure): PixelSize | null {
  try {
    return imageSize(new Uint8Array(bytes.subarray(0, structure.headerEnd)));
  } catch {
    return null;
  }
}

async function describe(type: PhotoType, size: PixelSize, structure: ImageStructure): Promise<ImageFacts> {
  const exif = await readExif(structure.exif);
  // HEIC turns by its own property and repeats it in EXIF: its own counts.
  const orientation = structure.orientation ?? exif.orientation ?? 1;
  const lying = orientation >= 5;
  return {
    type,
    width: lying ? size.height : size.width,
    height: lying ? size.width : size.height,
    orientation,
    ...(exif.takenAt && { takenAt: exif.takenAt }),
  };
}

function refuse(code: PhotoRefusal): ImageVerdict {
  return { ok: false, code };
}
