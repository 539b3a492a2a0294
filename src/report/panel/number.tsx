import type { Printed } from '../view/shown';

/** A number as printed; its full precision appears when it is pointed at. */
export function Number({ printed }: { readonly printed: Printed | null }) {
  if (printed === null) return null;
  return printed.full === '' ? <>{printed.text}</> : <span title={printed.full}>{printed.text}</span>;
}
