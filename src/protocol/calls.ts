/** Why a call was never answered: the other side ended before it did, for the reason given. */
export class OtherSideGone extends Error {
  constructor(reason: string) {
    super(reason);
    this.name = 'OtherSideGone';
  }
}

interface Waiting<Reply> {
  readonly resolve: (reply: Reply) => void;
  readonly reject: (reason: Error) => void;
}

/**
 * Calls that wait for their reply. Each gets a number of its own, counted up from 1 and never used twice; every reply
 * carries the number of its call. A call always settles: with its reply, or with OtherSideGone when the other side dies.
 */
export class Calls<Reply extends { readonly call: number }> {
  private readonly waiting = new Map<number, Waiting<Reply>>();
  private last = 0;

  /** Sends what `send` makes of the new call's number and gives the reply to it. */
  open(send: (call: number) => void): { readonly call: number; readonly reply: Promise<Reply> } {
    const call = ++this.last;
    const reply = new Promise<Reply>((resolve, reject) => this.waiting.set(call, { resolve, reject }));
    try {
      send(call);
    } catch (error) {
      this.refuse(call, error instanceof Error ? error : new Error(String(error)));
    }
    return { call, reply };
  }

  /** Hands a reply to its call; false when nobody waits for it (a call given up, or answered twice). */
  answered(reply: Reply): boolean {
    const waiting = this.waiting.get(reply.call);
    this.waiting.delete(reply.call);
    waiting?.resolve(reply);
    return waiting !== undefined;
  }

  /** Rejects one call. */
  refuse(call: number, reason: Error): void {
    const waiting = this.waiting.get(call);
    this.waiting.delete(call);
    waiting?.reject(reason);
  }

  /** The other side died: every waiting call is rejected. Later calls go to whoever takes its place. */
  gone(reason: string): void {
    const left = [...this.waiting.values()];
    this.waiting.clear();
    for (const waiting of left) waiting.reject(new OtherSideGone(reason));
  }
}
