import { describe, expect, it } from 'vitest';
import { flowBlocks, planCard } from '#shared/sheet/word-block.js';
import type { CardWords, WordBlock } from '#shared/sheet/word-block.js';

function block(...heights: number[]): WordBlock {
  return {
    rows: heights.map((height) => ({ height, draw: () => [] })),
    height: heights.reduce((sum, height) => sum + height, 0),
  };
}

function words(short: number, more = 0): CardWords {
  return { short: block(short), full: block(short, ...(more > 0 ? [more] : [])) };
}

describe('a card', () => {
  it('says everything where it fits, and points nowhere', () => {
    const items = [words(16, 10), words(16)];
    expect(planCard(items, 42, 7)).toEqual({ here: items.map(({ full }) => full), onward: [] });
  });

  it('keeps room for the line that points onward, and repeats in full what it cut short', () => {
    const items = [words(16, 10), words(16, 10)];
    const { here, onward } = planCard(items, 50, 7);
    expect(here).toEqual([items[0]?.full, items[1]?.short]);
    expect(onward).toEqual([items[1]?.full]);
  });

  it('passes on in full, in their order, what has no room at all', () => {
    const items = [words(16), words(16, 30), words(16), words(5)];
    const { here, onward } = planCard(items, 40, 7);
    expect(here).toEqual([items[0]?.full, items[1]?.short]);
    expect(onward).toEqual([items[1]?.full, items[2]?.full, items[3]?.full]);
  });
});

describe('blocks on following cards', () => {
  it('stay whole where one card can hold them', () => {
    const areas = flowBlocks([block(10, 10, 10), block(10, 10)], 40);
    expect(areas.map((rows) => rows.length)).toEqual([3, 2]);
  });

  it('are cut between rows where none could', () => {
    const areas = flowBlocks([block(10, 10, 10, 10, 10, 10)], 40);
    expect(areas.map((rows) => rows.length)).toEqual([4, 2]);
  });

  it('need no card where there are none', () => {
    expect(flowBlocks([], 40)).toEqual([]);
  });
});
