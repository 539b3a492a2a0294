/** A settings block in a Markdown fence; the fence is longer than any run of backticks in it, so that nothing in a block can end it. */
export function fenced(block: string): string {
  const runs = block.match(/`+/gu) ?? [];
  const fence = '`'.repeat(Math.max(3, ...runs.map(run => run.length + 1)));
  return `${fence}toml\n${block}${fence}\n`;
}
