/** A label that wants to stand at `anchor` and takes `height` along the line. */
export interface Wish {
  readonly anchor: number;
  readonly height: number;
}

interface Block {
  readonly first: number;
  readonly count: number;
  readonly height: number;
  readonly top: number;
}

const merge = (upper: Block, lower: Block): Block => {
  const count = upper.count + lower.count;
  const top = (upper.top * upper.count + (lower.top - upper.height) * lower.count) / count;
  return { first: upper.first, count, height: upper.height + lower.height, top };
};

/**
 * Tops of labels along a line so that none overlap, their order is kept, and the sum of squared
 * distances from where they want to be (`anchor` at their middle) is least. Labels that would
 * collide move as one block (pool adjacent violators). All stay at or below `from`; they may run
 * past `to` only when they do not fit.
 */
export function placeAlong(wishes: readonly Wish[], from: number, to: number): number[] {
  const blocks: Block[] = [];
  const within = (block: Block): Block => ({
    ...block,
    top: Math.max(from, Math.min(block.top, to - block.height)),
  });
  wishes.forEach(({ anchor, height }, index) => {
    let block = within({ first: index, count: 1, height, top: anchor - height / 2 });
    for (
      let above = blocks.at(-1);
      above && above.top + above.height > block.top;
      above = blocks.at(-1)
    ) {
      blocks.pop();
      block = within(merge(above, block));
    }
    blocks.push(block);
  });
  const tops: number[] = [];
  for (const block of blocks) {
    let top = block.top;
    for (let i = block.first; i < block.first + block.count; i += 1) {
      tops[i] = top;
      top += wishes[i].height;
    }
  }
  return tops;
}
