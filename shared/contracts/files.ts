import { z } from 'zod';
import { FILE_TYPES } from '../photos/limits';
import { defineRoute } from './contract';
import { uuid } from './uuid';

const address = z.strictObject({
  id: uuid,
  /** the file's own bytes name it: SHA-256 in lower-case hex */
  sha256: z.string().regex(/^[0-9a-f]{64}$/),
});

/** A file as the server keeps it. Width and height are those of the upright picture in pixels; a recorder's file has none. */
export const fileSchema = z.strictObject({
  sha256: address.shape.sha256,
  type: z.enum(FILE_TYPES),
  bytes: z.int().positive(),
  width: z.int().positive().nullable(),
  height: z.int().positive().nullable(),
});

/** The bytes are read and judged each time; sending the same file again changes nothing and answers the same. */
export const putFile = defineRoute({
  method: 'put',
  path: '/api/jobs/{id}/files/{sha256}',
  permission: 'file.put',
  params: address,
  request: 'bytes',
  response: fileSchema,
  summary: 'Send a photo (JPEG, PNG, WebP, HEIC) or, as text/csv, a recorder file under its hash',
});

export const getFile = defineRoute({
  method: 'get',
  path: '/api/jobs/{id}/files/{sha256}',
  permission: 'file.get',
  params: address,
  response: 'bytes',
  summary: 'The original bytes of a photo, a preview or a recorder file',
});

export const fileRoutes = [putFile, getFile];
