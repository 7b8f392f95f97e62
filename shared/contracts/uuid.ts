import { z } from 'zod';

/** An id in its one spelling. The database takes capitals for the same id, the rules compare letter by letter. */
export const uuid = z.uuid().lowercase();
