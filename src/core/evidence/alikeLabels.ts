/** How a label reads to a person in a hurry: capitals, widths and spaces told apart no more (Unicode NFKC, lower case). */
const glance = (label: string): string => label.normalize('NFKC').replace(/\s+/g, ' ').trim().toLowerCase();

/** Labels that differ only in capitals, spaces or width, set by set, in the order given; single ones are absent. */
export function alikeLabels(labels: readonly string[]): readonly (readonly string[])[] {
  const sets = new Map<string, string[]>();
  for (const label of labels) {
    if (label === '') continue;
    const set = sets.get(glance(label));
    if (set === undefined) sets.set(glance(label), [label]);
    else set.push(label);
  }
  return [...sets.values()].filter(set => set.length > 1);
}
