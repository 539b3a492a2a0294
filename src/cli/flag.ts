/** One flag of a command: parsing and help are both made from it. */
export interface Flag {
  readonly name: string;
  /** How its value reads in the help; null for a flag that is only there or not. */
  readonly value: string | null;
  /** May be given more than once. */
  readonly repeats?: boolean;
  readonly choices?: readonly string[];
  readonly says: string;
  /** Heading of the help. */
  readonly about: About;
}

export type About =
  | 'columns and groups'
  | 'the comparison'
  | 'the rows'
  | 'reading the file'
  | 'the record'
  | 'output'
  | 'what the file shows';
