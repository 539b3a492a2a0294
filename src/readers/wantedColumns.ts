import type { Field, LabelColumn, NumberColumn } from '../core/model/cells';
import { Refusal } from '../core/model/problem';
import { BothSinks, type CellSink } from './cellSink';
import type { CellFormat } from './cellText';
import { findField } from './findField';
import { LabelSink } from './labelSink';
import type { Met } from './met';
import { NumberSink } from './numberSink';

export interface BuiltColumns {
  readonly numbers: ReadonlyMap<number, NumberColumn>;
  readonly labels: ReadonlyMap<number, LabelColumn>;
}

/** Gathers the wanted columns over one or more files; columns of a later file are found by the names of the first. */
export class WantedColumns {
  private readonly numbers: ReadonlyMap<number, NumberSink>;
  private readonly labels: ReadonlyMap<number, LabelSink>;
  private readonly isKept: (line: number) => boolean;

  constructor(
    private readonly fields: readonly Field[],
    wanted: {
      readonly numbers: readonly number[];
      readonly labels: readonly number[];
      readonly keepLines?: ReadonlySet<number> | 'all';
    },
    expectedRows: number,
  ) {
    const kept = wanted.keepLines ?? new Set<number>();
    this.isKept = line => kept === 'all' || kept.has(line);
    this.numbers = new Map(wanted.numbers.map(field => [field, new NumberSink(expectedRows)]));
    this.labels = new Map(wanted.labels.map(field => [field, new LabelSink(expectedRows)]));
  }

  /**
   * The sinks of one file, one a column of it.
   * @throws Refusal column-unknown, column-ambiguous
   */
  sinksOf(fields: readonly Field[], format: CellFormat, met: Met): readonly (CellSink | null)[] {
    const sinks: (CellSink | null)[] = fields.map(() => null);
    for (const [field, sink] of this.numbers) {
      const place = this.placeOf(field, fields, met.file);
      sink.from({ format, met, field: place, isKept: this.isKept });
      sinks[place] = sink;
    }
    for (const [field, sink] of this.labels) {
      const place = this.placeOf(field, fields, met.file);
      const other = sinks[place] ?? null;
      sinks[place] = other === null ? sink : new BothSinks(other, sink);
    }
    return sinks;
  }

  build(): BuiltColumns {
    const name = (field: number): string => this.fields[field]?.name ?? '';
    const unit = (field: number): string | null => this.fields[field]?.unit ?? null;
    return {
      numbers: new Map(
        [...this.numbers].map(([field, sink]) => [field, sink.build(name(field), unit(field))]),
      ),
      labels: new Map([...this.labels].map(([field, sink]) => [field, sink.build(name(field))])),
    };
  }

  /** A column that shares its name, or has none, is found by its place. */
  private placeOf(field: number, fields: readonly Field[], file: number): number {
    if (fields === this.fields) return field;
    const name = this.fields[field]?.name ?? '';
    const isUnique = name.trim() !== '' && this.fields.filter(other => other.name === name).length === 1;
    try {
      return findField(fields, isUnique ? name : `#${field + 1}`);
    } catch (error) {
      if (!(error instanceof Refusal)) throw error;
      throw new Refusal(error.code, error.facts, { file, line: 1, field: 0 });
    }
  }
}
