import { createHash } from 'node:crypto';
import type { Hasher } from '../core/model/hasher';

/** SHA-256 of the platform, fed while reading. */
export function createHasher(): Hasher {
  const hash = createHash('sha256');
  return {
    update: bytes => void hash.update(bytes),
    hex: () => hash.digest('hex'),
  };
}
