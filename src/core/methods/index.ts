import type { MethodDescriptor } from '../model/methods';
import { conservativeT } from './conservativeT';
import { knownSigmaZ } from './knownSigmaZ';
import { largeNZ } from './largeNZ';
import { miettinenNurminen } from './miettinenNurminen';
import { newcombe } from './newcombe';
import { pairedT } from './pairedT';
import { permutation } from './permutation';
import { pooledT } from './pooledT';
import { proportionZ } from './proportionZ';
import { separateT } from './separateT';
import { signFlip } from './signFlip';

/** Every method, in the order in which rows are printed. Pickers, flags, schema, help and JSON follow from this list. */
export const methods = [
  separateT,
  pooledT,
  conservativeT,
  largeNZ,
  knownSigmaZ,
  permutation,
  pairedT,
  signFlip,
  proportionZ,
  newcombe,
  miettinenNurminen,
] as const;

/** The method with this id, from the registry unless another list is given. */
export function methodById(
  id: string,
  list: readonly MethodDescriptor[] = methods,
): MethodDescriptor | undefined {
  return list.find(method => method.id === id);
}
