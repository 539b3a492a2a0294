/**
 * Sideways places for points of one column so that none covers another: in order of height, each at the place nearest to
 * the middle that is free. Deterministic; beyond `reach` points may overlap. All in units of the drawing.
 */
export function swarm(heights: readonly number[], size: number, reach: number): readonly number[] {
  const order = heights.map((_, at) => at).sort((a, b) => (heights[a] ?? 0) - (heights[b] ?? 0));
  const aside = new Array<number>(heights.length).fill(0);
  let near: number[] = [];
  for (const at of order) {
    const height = heights[at] ?? 0;
    near = near.filter(other => height - (heights[other] ?? 0) < size);
    const isFree = (place: number): boolean =>
      near.every(other => Math.hypot(place - (aside[other] ?? 0), height - (heights[other] ?? 0)) >= size);
    aside[at] = places(size, reach).find(isFree) ?? 0;
    near.push(at);
  }
  return aside;
}

/** 0, then alternately right and left by halves of a point's size. */
function places(size: number, reach: number): readonly number[] {
  const list = [0];
  for (let step = size / 2; step <= reach; step += size / 2) list.push(step, -step);
  return list;
}
