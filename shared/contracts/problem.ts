import { z } from 'zod';

/** One field that was not understood. `code` is a message key under `errors.field`. */
export const fieldProblem = z.strictObject({ path: z.string(), code: z.string(), detail: z.string() });

/**
 * The form of every answer that is not a success: RFC 9457, with the message key (under `errors`) as `code`.
 * `detail` is that message in English, for people who read a log; screens say it in their reader's language.
 */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  code: z.string(),
  detail: z.string(),
  /** what goes into the message */
  params: z.record(z.string(), z.union([z.string(), z.number()])).optional(),
  fields: z.array(fieldProblem).optional(),
  /** the request's id, as it stands in the log */
  instance: z.string().optional(),
});
export type Problem = z.infer<typeof problemSchema>;
export type FieldProblem = z.infer<typeof fieldProblem>;
