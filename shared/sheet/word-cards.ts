import { CARD_AREA, CARD_BOTTOM_MM, cardPage, stackedRows } from './card-page.js';
import { cardHead } from './month-head.js';
import { undatedWords } from './month-words.js';
import { pageFoot } from './page-foot.js';
import type { SheetPage } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { rule } from './strokes.js';
import type { TextMeasurer } from './text-layout.js';
import { flowBlocks, LEGEND, plainBlock } from './word-block.js';
import type { WordBlock } from './word-block.js';

/** On a page without holes the foot may take as much as it needs. */
const FULL_FOOT_MM = 120;
const AFTER_CHANGE_MM = 2;

/** The cards that are no month's: what has no date in the year, and what a mended board says otherwise than the one before it. */
export function wordCards(model: SheetModel, measurer: TextMeasurer): SheetPage[] {
  const { words, year, changes } = model;
  const undated = undatedWords(model, CARD_AREA, measurer).map(({ full }) => full);
  const changed = (changes?.lines ?? []).map((line) =>
    plainBlock(line, LEGEND, CARD_AREA, measurer, AFTER_CHANGE_MM),
  );
  return [
    ...cardsUnder(model, { heading: words.noDateHeading(year), namesDawnOrDusk: false }, undated, measurer),
    ...cardsUnder(
      model,
      { heading: changes?.title ?? '', namesDawnOrDusk: model.markers.length > 0 },
      changed,
      measurer,
    ),
  ];
}

/** As many cards as the blocks need, each under the same heading; none without a block. */
function cardsUnder(
  model: SheetModel,
  { heading, namesDawnOrDusk }: { readonly heading: string; readonly namesDawnOrDusk: boolean },
  blocks: readonly WordBlock[],
  measurer: TextMeasurer,
): SheetPage[] {
  const foot = pageFoot(model, CARD_AREA, namesDawnOrDusk, FULL_FOOT_MM, measurer);
  const footTop = CARD_BOTTOM_MM - foot.height;
  const topUnder = (name: string): number => cardHead(model, null, name, CARD_AREA, measurer).bottom + 4;
  // A counted heading may take a line more than the plain one.
  const counted = model.words.cardOf({ month: heading, card: 99, cards: 99 });
  const areas = flowBlocks(blocks, footTop - topUnder(counted) - 2);
  return areas.map((rows, index) => {
    const name =
      areas.length === 1
        ? heading
        : model.words.cardOf({ month: heading, card: index + 1, cards: areas.length });
    const head = cardHead(model, null, name, CARD_AREA, measurer);
    return cardPage(
      model,
      { kind: 'words-card', month: null, name },
      [
        ...head.primitives,
        rule(CARD_AREA.left, CARD_AREA.right, head.bottom + 1.5),
        ...stackedRows(rows, topUnder(name)),
        ...foot.draw(footTop),
      ],
      measurer,
    );
  });
}
