import type { SpineLayout } from '../../charts/spine-layout.js';

/**
 * A thin line from a row at the side to the place on the spine it speaks of, with one elbow where
 * the row had to move. SVG path data in the coordinates of the whole beam path.
 */
export function leaderPath(
  row: HTMLElement,
  spine: HTMLElement,
  layout: SpineLayout,
  anchor: number,
): string {
  const side = row.parentElement as HTMLElement;
  const onLeft = side.offsetLeft < spine.offsetLeft;
  const y = row.offsetTop + row.offsetHeight - 13;
  const edge = onLeft ? side.offsetLeft + side.offsetWidth + 3 : side.offsetLeft - 3;
  const body = spine.offsetLeft + (onLeft ? layout.left - 6 : layout.right + layout.recede.x + 6);
  const inBody = anchor >= layout.support.top;
  const clear = anchor === layout.tube && !onLeft ? 112 : 56;
  const near = spine.offsetLeft + layout.axis + (onLeft ? -clear : clear);
  const end = inBody ? body : near;
  const elbow = onLeft ? edge + 8 : edge - 8;
  return `M${edge},${y} H${elbow} L${onLeft ? Math.max(elbow, edge + 16) : Math.min(elbow, edge - 16)},${anchor} H${end} `;
}
