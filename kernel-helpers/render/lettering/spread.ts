export interface Slot {
  /** Where the middle would best be. */
  readonly wanted: number;
  readonly height: number;
}

/**
 * Middles for labels in a column, each as near to where it is wanted as the others let it, none
 * overlapping and their order kept. If they do not all fit in the range they run on past its end.
 */
export function spread(
  slots: readonly Slot[],
  { from, to, gap }: { from: number; to: number; gap: number },
): readonly number[] {
  const order = slots.map((_, i) => i).sort((a, b) => at(slots, a).wanted - at(slots, b).wanted);
  // Labels that would overlap form a block, whose place is the one that moves its members least.
  const blocks: { members: number[]; size: number; top: number }[] = [];
  for (const i of order) {
    let block = { members: [i], size: at(slots, i).height, top: 0 };
    block.top = topOf(block);
    for (let above = blocks.at(-1); above && above.top + above.size + gap > block.top;) {
      blocks.pop();
      block = {
        members: [...above.members, ...block.members],
        size: above.size + gap + block.size,
        top: 0,
      };
      block.top = topOf(block);
      above = blocks.at(-1);
    }
    blocks.push(block);
  }
  const middles = new Array<number>(slots.length).fill(0);
  for (const block of blocks) {
    let y = block.top;
    for (const i of block.members) {
      const { height } = at(slots, i);
      middles[i] = y + height / 2;
      y += height + gap;
    }
  }
  return middles;

  function topOf({ members, size }: { members: readonly number[]; size: number }): number {
    let offset = 0;
    let sum = 0;
    for (const i of members) {
      const { wanted, height } = at(slots, i);
      sum += wanted - height / 2 - offset;
      offset += height + gap;
    }
    return Math.max(from, Math.min(sum / members.length, to - size));
  }
}

function at(slots: readonly Slot[], i: number): Slot {
  return slots[i] ?? { wanted: 0, height: 0 };
}
