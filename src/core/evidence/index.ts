import type { EvidenceDescriptor } from '../model/comparison';
import { brownForsythe } from './brownForsythe';
import { constant } from './constant';
import { footerRow } from './footerRow';
import { labelVariants } from './labelVariants';
import { raggedRows } from './raggedRows';
import { readOtherwise } from './readOtherwise';
import { sharedUnit } from './sharedUnit';
import { thousandsMarks } from './thousandsMarks';
import { varianceRatio } from './varianceRatio';

/** Every check of what the file shows, in the order in which findings of one level are printed. */
export const evidenceChecks = [
  labelVariants,
  sharedUnit,
  raggedRows,
  footerRow,
  readOtherwise,
  thousandsMarks,
  constant,
  varianceRatio,
  brownForsythe,
] as const;

/** The check with this id, from the list unless another is given. */
export function evidenceById(
  id: string,
  list: readonly EvidenceDescriptor[] = evidenceChecks,
): EvidenceDescriptor | undefined {
  return list.find(check => check.id === id);
}
