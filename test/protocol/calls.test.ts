import { describe, expect, it } from 'vitest';
import { Calls, OtherSideGone } from '../../src/protocol/calls';
import { giveUp, isGivenUp, makeCancelFlags } from '../../src/protocol/cancelFlags';

interface Reply {
  readonly call: number;
  readonly text: string;
}

describe('calls to the other side', () => {
  it('give every reply to the call it belongs to, whatever the order', async () => {
    const calls = new Calls<Reply>();
    const first = calls.open(() => undefined);
    const second = calls.open(() => undefined);
    calls.answered({ call: second.call, text: 'second' });
    calls.answered({ call: first.call, text: 'first' });
    expect([(await first.reply).text, (await second.reply).text]).toEqual(['first', 'second']);
  });

  it('settle a call once: a second reply, or one nobody waits for, is turned away', async () => {
    const calls = new Calls<Reply>();
    const { call, reply } = calls.open(() => undefined);
    expect(calls.answered({ call, text: 'once' })).toBe(true);
    expect(calls.answered({ call, text: 'twice' })).toBe(false);
    expect(calls.answered({ call: call + 1, text: 'nobody' })).toBe(false);
    expect((await reply).text).toBe('once');
  });

  it('reject every waiting call when the other side dies, and take new ones after it', async () => {
    const calls = new Calls<Reply>();
    const waiting = [calls.open(() => undefined), calls.open(() => undefined)];
    calls.gone('exit code 1');
    for (const { reply } of waiting) await expect(reply).rejects.toThrow(OtherSideGone);
    const later = calls.open(() => undefined);
    calls.answered({ call: later.call, text: 'alive' });
    expect((await later.reply).text).toBe('alive');
  });

  it('reject a call that could not be sent', async () => {
    const calls = new Calls<Reply>();
    const { reply } = calls.open(() => {
      throw new Error('cannot be cloned');
    });
    await expect(reply).rejects.toThrow('cannot be cloned');
  });
});

describe('giving up', () => {
  it('is seen for the call it was said of and for no other', () => {
    const flags = makeCancelFlags();
    if (flags === null) throw new Error('Node shares memory');
    giveUp(flags, 7);
    expect(isGivenUp(flags, 7)).toBe(true);
    expect(isGivenUp(flags, 8)).toBe(false);
    expect(isGivenUp(flags, 7 + 256)).toBe(false);
    expect(isGivenUp(null, 7)).toBe(false);
  });
});
