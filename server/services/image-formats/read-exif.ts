import exifr from 'exifr';

/** What the camera wrote beside the picture, as text and unjudged: a camera's clock is no evidence of time. */
export interface ExifFacts {
  /** 1 to 8 as EXIF counts them. */
  orientation?: number;
  /** `2026-03-02T03:10:05`, with the offset behind it when the camera wrote one. */
  takenAt?: string;
}

/** Reads orientation and time from a TIFF block; a damaged block tells nothing and is no reason to refuse. */
export async function readExif(block: Buffer | undefined): Promise<ExifFacts> {
  if (!block || block.length < 14) return {};
  const tags = await parse(block);
  const orientation = Number(tags['Orientation']);
  const takenAt = timeText(tags['DateTimeOriginal'], tags['OffsetTimeOriginal']);
  return {
    ...(Number.isInteger(orientation) && orientation >= 1 && orientation <= 8 && { orientation }),
    ...(takenAt && { takenAt }),
  };
}

async function parse(block: Buffer): Promise<Record<string, unknown>> {
  try {
    const tags: unknown = await exifr.parse(block, {
      pick: ['Orientation', 'DateTimeOriginal', 'OffsetTimeOriginal'],
      reviveValues: false,
      translateValues: false,
    });
    return tags && typeof tags === 'object' ? (tags as Record<string, unknown>) : {};
  } catch {
    return {};
  }
}

function timeText(time: unknown, offset: unknown): string | undefined {
  const parts = /^(\d{4}):(\d{2}):(\d{2}) (\d{2}:\d{2}:\d{2})/.exec(String(time));
  if (!parts) return undefined;
  const zone = /^[+-]\d{2}:\d{2}/.exec(String(offset))?.[0] ?? '';
  return `${parts[1]}-${parts[2]}-${parts[3]}T${parts[4]}${zone}`;
}
