// Control characters and marks that reorder text could make a label read as something it is not.
// eslint-disable-next-line no-control-regex -- they are what is looked for
const UNSEEN = /[\u0000-\u001f\u007f-\u009f\u200b\u200e\u200f\u2028-\u202e\u2066-\u2069\ufeff]/g;

/** Text of a file as it may stand in a sentence: what cannot be seen is shown as its code. */
export const visible = (text: string): string => text.replace(/\r?\n/g, '⏎').replace(UNSEEN, codeOf);

const codeOf = (mark: string): string => `\\u${mark.charCodeAt(0).toString(16).padStart(4, '0')}`;

/** A label, a column or a cell in a sentence: exactly as written, in quotation marks where its ends could not be seen. */
export function showLabel(text: string): string {
  const shown = visible(text);
  return shown === '' || shown !== shown.trim() ? `“${shown}”` : shown;
}

/** A cell's text quoted in a sentence, always in quotation marks. */
export const quoted = (text: string): string => `“${visible(text)}”`;
