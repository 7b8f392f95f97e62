/** Tables in which the application's account may read and insert, and nothing more. */
export const appendOnlyTables: readonly string[] = ['job_events'];
