const SLOTS = 256;

/** Shared flags, one slot a call (number modulo the slots); null where memory cannot be shared between threads. */
export function makeCancelFlags(): Int32Array<SharedArrayBuffer> | null {
  return typeof SharedArrayBuffer === 'undefined'
    ? null
    : new Int32Array(new SharedArrayBuffer(SLOTS * Int32Array.BYTES_PER_ELEMENT));
}

/** Marks a call as given up; the other thread sees it in the middle of a long loop. */
export function giveUp(flags: Int32Array, call: number): void {
  Atomics.store(flags, call % SLOTS, call);
}

/** Whether a call was given up. A slot that a later call took over no longer speaks for this one. */
export function isGivenUp(flags: Int32Array | null, call: number): boolean {
  return flags !== null && Atomics.load(flags, call % SLOTS) === call;
}
