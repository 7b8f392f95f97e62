const gone = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ETIMEDOUT',
  'EPIPE',
  'ENOTFOUND',
  'EHOSTUNREACH',
  'PROTOCOL_CONNECTION_LOST',
  'PROTOCOL_ENQUEUE_AFTER_FATAL_ERROR',
  'ER_SERVER_SHUTDOWN',
  'ER_CON_COUNT_ERROR',
  'ER_CONNECTION_KILLED',
  'ER_LOCK_WAIT_TIMEOUT',
  'ER_LOCK_DEADLOCK',
  'ER_DISK_FULL',
  'ER_RECORD_FILE_FULL',
  'ER_TOO_MANY_USER_CONNECTIONS',
  'ENOSPC',
  'EDQUOT',
  'EROFS',
  'EIO',
  'EMFILE',
  'ENFILE',
]);

/**
 * Whether a failure is the machine's and passes by itself (database restarting, disk full, a lock that did not come):
 * the caller is told to come again. Everything else is the program's own fault.
 */
export function isPassing(error: unknown): boolean {
  for (let at: unknown = error, depth = 0; at instanceof Error && depth < 5; depth += 1) {
    if ('code' in at && typeof at.code === 'string' && gone.has(at.code)) return true;
    if (/Connection lost|closed state|Pool is closed/i.test(at.message)) return true;
    at = 'driverError' in at && at.driverError !== at ? at.driverError : at.cause;
  }
  return false;
}
