import type { Reading } from '../core/model/cells';

const KEPT = 20;
const LONGEST_TEXT = 200;

/** Keeps account of what was met while reading: every one counted, the first 20 of a kind with their place and text. */
export class Met {
  private readonly kept: Reading['met'][number][] = [];
  private readonly counts = new Map<string, number>();

  constructor(readonly file: number) {}

  note(what: string, line: number, text: string, field = 0): void {
    const count = (this.counts.get(what) ?? 0) + 1;
    this.counts.set(what, count);
    if (count > KEPT) return;
    this.kept.push({ what, at: { file: this.file, line, field }, text: text.slice(0, LONGEST_TEXT) });
  }

  /** Counts what was met elsewhere too. */
  noteAll(met: Reading['met']): void {
    for (const { what, at, text } of met) this.note(what, at.line, text, at.field);
  }

  get all(): Reading['met'] {
    return this.kept;
  }

  get perKind(): Reading['metCounts'] {
    return Object.fromEntries(this.counts);
  }
}
