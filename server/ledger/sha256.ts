import { createHash } from 'node:crypto';
import type { HashText } from '../../shared/ledger/chain';

/** SHA-256 of a text in UTF-8 as 64 hex digits: the hash that the shared rules are handed. */
export const sha256: HashText = (text) => createHash('sha256').update(text, 'utf8').digest('hex');
