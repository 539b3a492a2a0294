/** Style of a figure that stands outside the editor: dark marks on white, told apart in greys as well as in colours. */
export const figureStyle = `
.wb-sheet, .wb-plot { font-family: "Segoe UI", "Helvetica Neue", Arial, sans-serif; font-size: 12px; fill: #1f2328; }
.wb-paper { fill: #ffffff; }
.wb-grid { stroke: #e3e5e8; stroke-width: 1; }
.wb-tick, .wb-under, .wb-caption { fill: #59636e; }
.wb-axis-name { fill: #1f2328; }
.wb-name { font-weight: 600; }
.wb-under { font-weight: 400; }
.wb-group-1 .wb-point, .wb-group-1 .wb-density, .wb-group-1 .wb-share { fill: #1f5fa8; stroke: #1f5fa8; }
.wb-group-2 .wb-point, .wb-group-2 .wb-density, .wb-group-2 .wb-share { fill: #b4530a; stroke: #b4530a; }
.wb-group-3 .wb-point, .wb-group-3 .wb-density, .wb-group-3 .wb-share { fill: #2e7d4f; stroke: #2e7d4f; }
.wb-group-4 .wb-point, .wb-group-4 .wb-density, .wb-group-4 .wb-share { fill: #7a4aa0; stroke: #7a4aa0; }
.wb-group-5 .wb-point, .wb-group-5 .wb-density, .wb-group-5 .wb-share { fill: #8a6d00; stroke: #8a6d00; }
.wb-group-6 .wb-point, .wb-group-6 .wb-density, .wb-group-6 .wb-share { fill: #a02c4a; stroke: #a02c4a; }
.wb-point { fill-opacity: 0.75; stroke-width: 0; }
.wb-points-small .wb-point { fill-opacity: 0.45; }
.wb-point-far { fill-opacity: 0; stroke-width: 1.2; }
.wb-points-small .wb-point-far { fill-opacity: 0; stroke-width: 0.9; }
.wb-density { fill-opacity: 0.25; stroke-width: 1; }
.wb-share { fill-opacity: 0.55; }
.wb-pairs line { stroke: #8b949e; stroke-width: 1; }
.wb-mean line { stroke: #1f2328; stroke-width: 1.6; }
.wb-mean .wb-mean-mark { stroke-width: 2.6; }
.wb-rule line { stroke: #1f2328; stroke-width: 1.2; }
.wb-rule text { fill: #1f2328; }
.wb-rule-matters line { stroke-dasharray: 5 3; }
.wb-rule-margin line { stroke-dasharray: 1.5 3; }
.wb-rule-zero line { stroke: #8b949e; }
.wb-interval { stroke: #1f2328; stroke-width: 2; }
.wb-estimate { fill: #1f2328; }
.wb-difference-point { fill: #59636e; fill-opacity: 0.6; }
`;
