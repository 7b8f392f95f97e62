import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';

/** SHA-256 of a text as 64 hex digits, at once: the rules are judged while somebody types and cannot wait for a promise. */
export const hashText = (text: string): string => bytesToHex(sha256(utf8ToBytes(text)));
