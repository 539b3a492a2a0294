import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';
import type { Hasher } from '../../core/model/hasher';

/** SHA-256 where no synchronous, streaming one is built in. */
export function createHasher(): Hasher {
  const hash = sha256.create();
  const encoder = new TextEncoder();
  return {
    update: bytes => void hash.update(typeof bytes === 'string' ? encoder.encode(bytes) : bytes),
    hex: () => bytesToHex(hash.digest()),
  };
}
