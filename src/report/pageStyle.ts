/** The look of an exported page: a fixed light palette, made for paper as well as for a screen. */
export const pageStyle = `
  body { max-width: 46rem; margin: 2rem auto; padding: 0 1rem; font: 15px/1.5 Georgia, serif; color: #1f2328; background: #fff; }
  h1 { font-size: 1.5rem; line-height: 1.25; } h2 { font-size: 1.1rem; margin-top: 2rem; }
  table { border-collapse: collapse; width: 100%; margin: 0.75rem 0; font-variant-numeric: tabular-nums; }
  caption { text-align: left; font-style: italic; overflow-wrap: anywhere; }
  th, td { text-align: left; vertical-align: top; padding: 0.2rem 0.75rem 0.2rem 0; border-bottom: 1px solid #d8dee4; font-weight: normal; overflow-wrap: anywhere; }
  figure { margin: 1rem 0; } figure svg { max-width: 100%; height: auto; }
  pre { font-size: 12px; white-space: pre-wrap; overflow-wrap: anywhere; border: 1px solid #d8dee4; padding: 0.75rem; }
  @media print { body { margin: 0; max-width: none; } h2, table, figure { break-inside: avoid; } }
`;
