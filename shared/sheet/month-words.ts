import { daysInMonth, isoOf } from './civil-days.js';
import { entryStretches, markerRange, touchesYear } from './spans.js';
import type { SheetEntry, SheetMarker, SheetModel } from './sheet-model.js';
import { joinLabel } from './text-layout.js';
import type { TextMeasurer } from './text-layout.js';
import { LEGEND_BOLD, nameBlock, plainBlock, smallBlock } from './word-block.js';
import type { BlockArea, CardWords, WordDetail } from './word-block.js';

/** The words of one month: notices that hold in it, then what comes in it in large letters, what only begins or ends in it in a small list. */
export function monthWords(
  model: SheetModel,
  month: number,
  area: BlockArea,
  measurer: TextMeasurer,
): CardWords[] {
  const first = isoOf(model.year, month, 1);
  const last = isoOf(model.year, month, daysInMonth(model.year, month));
  const large: { readonly date: string; readonly block: CardWords }[] = [];
  const small: CardWords[] = [];

  for (const marker of model.markers) {
    const range = markerRange(marker);
    if (range === null || marker.expected === null || range.to < first || range.from > last) continue;
    if (marker.expected >= first && marker.expected <= last) {
      large.push({ date: marker.expected, block: markerBlock(model, marker, range, area, measurer) });
    } else {
      const sentence = model.words.markerMayCome({ title: joinLabel(marker.titles), ...range });
      small.push(smallBlock({ tag: marker.letter, kind: 'marker' }, sentence, area, measurer));
    }
  }
  large.sort((a, b) => compare(a.date, b.date));
  const names = large.map(({ block }) => block);

  const entries: { readonly date: string; readonly block: CardWords }[] = [];
  for (const entry of model.entries) {
    const stretches = entryStretches(entry);
    const main = stretches.find(({ look }) => look !== 'margin');
    const mainFrom = main?.from ?? entry.fixedDate;
    const mainTo = main?.to ?? entry.fixedDate;
    const isNow = (from: string, to: string): boolean => from <= last && to >= first;
    const fixedNow = entry.fixedDate !== null && isNow(entry.fixedDate, entry.fixedDate);
    if (mainFrom !== null && mainTo !== null && (isNow(mainFrom, mainTo) || fixedNow)) {
      entries.push({ date: mainFrom, block: entryBlock(model, entry, area, measurer) });
      continue;
    }
    const margin = stretches.find(({ from, to }) => isNow(from, to));
    if (margin === undefined) continue;
    const title = joinLabel(entry.titles);
    const isEarly = mainFrom === null || margin.to < mainFrom;
    const sentence = isEarly
      ? model.words.earlyFrom({ title, date: margin.from })
      : model.words.lateUntil({ title, date: margin.to });
    small.push(smallBlock({ tag: String(entry.number), kind: 'entry' }, sentence, area, measurer));
  }
  entries.sort((a, b) => compare(a.date, b.date));
  const notices = (model.notices ?? [])
    .filter(({ issued, expires }) => issued <= last && expires >= first)
    .map((notice) => plainBlock(model.words.notice(notice), LEGEND_BOLD, area, measurer))
    .map((block): CardWords => ({ short: block, full: block }));
  return [...notices, ...names, ...entries.map(({ block }) => block), ...small];
}

/** What has no date in the sheet's year, each with the reason in plain words. */
export function undatedWords(model: SheetModel, area: BlockArea, measurer: TextMeasurer): CardWords[] {
  const sentence = (titles: SheetEntry['titles'], reason: string | null): string =>
    reason === null || reason === ''
      ? model.words.noDate(joinLabel(titles))
      : model.words.noDateBecause({ title: joinLabel(titles), reason });
  return [
    ...model.markers
      .filter((marker) => marker.expected === null)
      .map((marker) =>
        smallBlock(
          { tag: marker.letter, kind: 'marker' },
          sentence(marker.titles, marker.whyNoDate),
          area,
          measurer,
        ),
      ),
    ...model.entries
      .filter((entry) => !touchesYear(entry, model.year))
      .map((entry) =>
        smallBlock(
          { tag: String(entry.number), kind: 'entry' },
          sentence(entry.titles, entry.whyNoDate),
          area,
          measurer,
        ),
      ),
  ];
}

function markerBlock(
  model: SheetModel,
  marker: SheetMarker,
  range: { from: string; to: string },
  area: BlockArea,
  measurer: TextMeasurer,
): CardWords {
  const { letter: tag, icon, titles, phenomenon } = marker;
  const date = marker.expected ?? range.from;
  const when = { side: [], sentence: model.words.markerSentence({ phenomenon, date, ...range }) };
  return nameBlock({ tag, kind: 'marker', icon, titles }, when, [], area, measurer);
}

/** When an entry is due: two short lines for the edge of a card, and the same as a sentence. */
export function entryWhen(model: SheetModel, entry: SheetEntry): { side: string[]; sentence: string } {
  const { words } = model;
  const main = entryStretches(entry).find(({ look }) => look !== 'margin');
  if (main?.look === 'watch') {
    return { side: [words.watchDays(), words.range(main.from, main.to)], sentence: words.watchFromTo(main) };
  }
  if (entry.fixedDate !== null) {
    return { side: [words.fixedDay(), words.day(entry.fixedDate)], sentence: words.fixedOn(entry.fixedDate) };
  }
  if (main === undefined) return { side: [], sentence: '' };
  return { side: [words.bestDays(), words.range(main.from, main.to)], sentence: words.bestFromTo(main) };
}

/** What to know about an entry besides its days, in the order look, last day, if late, stop, take care, who checked it. */
export function entryDetails(model: SheetModel, entry: SheetEntry): WordDetail[] {
  const { words } = model;
  const said = (text: string): boolean => text.trim() !== '';
  return [
    ...(said(entry.signs)
      ? [{ text: words.lookFor({ signs: entry.signs, needed: entry.signsNeeded }), bold: false }]
      : []),
    ...tickDetails(model, entry),
    ...(said(entry.dateSetBy) ? [{ text: words.dateSetBy(entry.dateSetBy), bold: false }] : []),
    ...(entry.lastAdvised === null ? [] : [{ text: words.lastAdvised(entry.lastAdvised), bold: true }]),
    ...(said(entry.ifLate) ? [{ text: words.ifLate(entry.ifLate), bold: false }] : []),
    ...(entry.stop ? [{ text: words.stopOn(entry.stop), bold: true }] : []),
    ...(said(entry.caution) ? [{ text: words.takeCare(entry.caution), bold: true }] : []),
    ...(entry.checked ?? []).map((check) => ({ text: words.checkedBy(check), bold: false })),
  ];
}

/** Empty circles for the signs that are waited for, and the one without which nothing begins. */
export function tickDetails(
  { words }: SheetModel,
  { signs, signsNeeded, mustHaveSign = '' }: SheetEntry,
): WordDetail[] {
  const count = signsNeeded ?? 0;
  if (signs.trim() === '' || count < 1) return [];
  return [{ text: words.tickSigns({ count, mustHave: mustHaveSign }), bold: false, circles: count }];
}

function entryBlock(
  model: SheetModel,
  entry: SheetEntry,
  area: BlockArea,
  measurer: TextMeasurer,
): CardWords {
  const name = {
    tag: String(entry.number),
    kind: 'entry',
    icon: entry.icon,
    titles: entry.titles,
  } as const;
  return nameBlock(name, entryWhen(model, entry), entryDetails(model, entry), area, measurer);
}

function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
