import { pipeline } from 'node:stream/promises';
import type { Request, Response } from 'express';
import type { FileType } from '../../shared/photos/limits';
import type { StoredFile } from '../storage/file-storage';

const ENDINGS: Record<FileType, string> = {
  'image/jpeg': 'jpg',
  'image/png': 'png',
  'image/webp': 'webp',
  'image/heic': 'heic',
  'text/csv': 'csv',
};

/**
 * Sends a stored file so that no browser takes it for anything else: its exact type, no guessing, a sandbox without
 * rights, and a name made of its hash. The address names the bytes, so they may be kept for good, by this person alone.
 */
export async function sendFile(
  req: Request,
  res: Response,
  file: { type: string; sha256: string },
  stored: StoredFile,
): Promise<void> {
  const ending = ENDINGS[file.type as FileType] ?? 'bin';
  const disposition = file.type.startsWith('image/') ? 'inline' : 'attachment';
  res.set({
    'Content-Type': file.type,
    'Content-Length': String(stored.bytes),
    'Content-Disposition': `${disposition}; filename="${file.sha256.slice(0, 16)}.${ending}"`,
    'Content-Security-Policy': "sandbox; default-src 'none'",
    'X-Content-Type-Options': 'nosniff',
    'Cross-Origin-Resource-Policy': 'same-origin',
    'Cache-Control': 'private, max-age=31536000, immutable',
    ETag: `"${file.sha256}"`,
  });
  if (req.method === 'HEAD' || req.fresh) {
    stored.stream.destroy();
    if (req.fresh) res.removeHeader('Content-Length');
    res.status(req.fresh ? 304 : 200).end();
    return;
  }
  await pipeline(stored.stream, res).catch((error: NodeJS.ErrnoException) => {
    // Whoever asked has gone away; nobody is left to be told.
    if (error.code !== 'ERR_STREAM_PREMATURE_CLOSE') throw error;
  });
}
