/** Where the table stands in a file and how its records are cut: all the scanner needs to know. */
export interface TableShape {
  /** One character below U+0080. */
  readonly delimiter: string;
  /** How many columns the header has. */
  readonly width: number;
  /** The line from which on records are data (or blank, comment or footer). */
  readonly dataLine: number;
  /** The first data rows, as text: a word that stands in them is a label, not the name of a footer row. */
  readonly sample: readonly (readonly string[])[];
}
