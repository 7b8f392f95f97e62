import type { PhotoRefusal } from '../../../shared/photos/refusals';

/** Width and height as a header states them, in pixels, before any turning. */
export interface PixelSize {
  width: number;
  height: number;
}

/** What walking through an image's own structure tells, without decoding a pixel. */
export interface ImageStructure {
  /** Offset behind the image's last byte; what follows is no part of it. */
  end: number;
  /** How many bytes from the start hold everything that states the size. */
  headerEnd: number;
  /** Every size that the file states for itself: a decoder may believe any of them. */
  sizes: PixelSize[];
  /** The TIFF block of the EXIF data, from its byte order mark. */
  exif?: Buffer;
  /** EXIF's orientation where the format has its own way to say it (1 to 8). */
  orientation?: number;
  /** Comments and metadata: the places inside an image where foreign text can hide. */
  texts: Buffer[];
}

/** More segments, chunks or boxes than this is no camera's file: it is made to keep the reader busy. */
export const MOST_PARTS = 20_000;

export type StructureResult = ImageStructure | PhotoRefusal;
