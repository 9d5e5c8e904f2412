import { type SVGTemplateResult, svg } from 'lit';
import type { MaterialFamily } from '../../materials/material.js';

/**
 * Section hatches, one per material family, as an engineering drawing sets them: they tell matter
 * apart without colour. Drawn in `--ink`, thin, so that labels stay readable over them.
 */
const tiles: Record<
  MaterialFamily,
  { size: number; turn?: number; marks: SVGTemplateResult } | null
> = {
  gas: null,
  adipose: {
    size: 9,
    marks: svg`<circle cx="2" cy="2" r=".8" class="dot" /><circle cx="6.5" cy="6.5" r=".8" class="dot" />`,
  },
  'soft tissue': { size: 9, turn: 45, marks: svg`<path d="M0,0 V9" />` },
  bone: { size: 6, turn: 45, marks: svg`<path d="M0,0 V6 M0,0 H6" />` },
  lung: {
    size: 14,
    marks: svg`<circle cx="4" cy="4" r="2.4" /><circle cx="11" cy="11" r="2.4" />`,
  },
  liquid: { size: 10, marks: svg`<path d="M0,2.5 H5 M5,7.5 H10" />` },
  plastic: { size: 10, turn: -45, marks: svg`<path d="M0,0 V10 M2.5,0 V10" />` },
  metal: { size: 3.5, turn: 45, marks: svg`<path d="M0,0 V3.5" class="heavy" />` },
  agent: {
    size: 5,
    marks: svg`<circle cx="1.2" cy="1.2" r="1" class="dot" /><circle cx="3.7" cy="3.7" r="1" class="dot" />`,
  },
  detector: { size: 2.5, marks: svg`<path d="M0,0 V2.5" class="heavy" />` },
};

const slug = (family: MaterialFamily): string => family.replace(' ', '-');

/** `<pattern>` definitions for a drawing; `prefix` keeps ids of two drawings on one page apart. */
export const hatchDefinitions = (prefix: string): SVGTemplateResult[] =>
  (Object.keys(tiles) as MaterialFamily[]).flatMap((family) => {
    const tile = tiles[family];
    if (!tile) return [];
    return svg`<pattern id="${prefix}-${slug(family)}" class="hatch" patternUnits="userSpaceOnUse"
      width=${tile.size} height=${tile.size} patternTransform="rotate(${tile.turn ?? 0})">${tile.marks}</pattern>`;
  });

/** The `fill` that hatches a shape in the given family. */
export const hatchFill = (prefix: string, family: MaterialFamily): string =>
  tiles[family] ? `url(#${prefix}-${slug(family)})` : 'none';
