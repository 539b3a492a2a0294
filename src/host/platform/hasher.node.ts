import { createHash } from 'node:crypto';
import type { Hasher } from '../../core/model/hasher';

/** SHA-256 by the platform's own library. */
export function createHasher(): Hasher {
  const hash = createHash('sha256');
  return {
    update: bytes => {
      if (typeof bytes === 'string') hash.update(bytes, 'utf8');
      else hash.update(bytes);
    },
    hex: () => hash.digest('hex'),
  };
}
