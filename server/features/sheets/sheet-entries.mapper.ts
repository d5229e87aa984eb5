import { anchorOf } from '#shared/calendar/anchors.js';
import { lateSaid, signsSaid } from '#shared/calendar/said-words.js';
import { boardOf } from '#shared/calendar/variants.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { GIVER_BY_ROLE } from '#shared/contracts/sharing.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { CHECKED_TEXTS, type SheetCheck, type SheetEntry } from '#shared/sheet/sheet-model.js';
import type { SheetWords } from '#shared/sheet/sheet-words.js';
import type { Translate } from '../../print/translator.js';
import { whyNoDate } from './why-no-date.js';

export interface EntryTexts {
  files: Translate;
  sky: Translate;
  words: SheetWords;
}

/**
 * The entries as they stand on the board. They are counted anew, so that the numbers say nothing about entries
 * that are not there.
 */
export function toSheetEntries(
  bodies: readonly VersionEntryBody[],
  year: number,
  texts: EntryTexts,
): SheetEntry[] {
  const titles = new Map(bodies.map(({ entryId, content }) => [entryId, content.titleOfficer]));
  return bodies
    .filter(({ content }) => needsALine(content))
    .flatMap((body) => linesOf(body, texts.files))
    .map(({ content, dates, title }, index) => ({
      number: index + 1,
      icon: content.icon,
      titles: title,
      window: {
        earliest: dates.window?.earliest ?? null,
        bestFrom: dates.window?.bestFrom ?? null,
        bestTo: dates.window?.bestTo ?? null,
        latest: dates.window?.lastAdvised ?? null,
      },
      isWatch: content.protectiveWatch,
      fixedDate: fixedDateOf({ content, dates }),
      dateSetBy: dateSetBy(content),
      lastAdvised: lastAdvisedOf({ content, dates }, year),
      signs: signsSaid(content),
      ...awaitedOf(content),
      ifLate: lateSaid(content),
      caution: content.caution,
      stop: stopOf(content, year),
      checked: checksOf(content),
      whyNoDate: dates.window ? null : reason({ content, dates }, year, texts, titles),
    }));
}

/** Where no number is said, all that are named are waited for. */
function awaitedOf({ record }: EntryInput): Pick<SheetEntry, 'signsNeeded' | 'mustHaveSign'> {
  const { list = [], needed = null, mustHave = null } = record?.signs ?? {};
  const must = mustHave === null ? undefined : list[mustHave];
  return {
    signsNeeded: list.length === 0 ? null : (needed ?? list.length),
    ...(must && { mustHaveSign: must.name }),
  };
}

interface Line extends Body {
  title: SheetEntry['titles'];
}

/** The entry by the days that drive the board, and every timing that is shown beside it, each a mark of its own. */
function linesOf(body: VersionEntryBody, files: Translate): Line[] {
  const { content, dates, variants = [] } = body;
  const title = { village: content.titleVillage, officer: content.titleOfficer };
  const { window, drivenBy, beside } = boardOf(body);
  const joined = drivenBy !== 'entry' && drivenBy !== 'variant';
  const told = (code: 'ownDays' | 'otherDays' | 'safeDays', giver: string) => ({
    village: title.village,
    officer:
      giver === '' && code !== 'safeDays'
        ? files('sheet.unnamedDays', { title: title.officer })
        : files(`sheet.${code}`, {
            title: title.officer,
            giver: giver === GIVER_BY_ROLE ? files('sheet.byRole') : giver,
          }),
  });
  const marks = beside.flatMap(({ variantId, window: own }): Line[] => {
    const variant = variants.find((one) => one.variantId === variantId);
    const dated = { ...(variant?.dates ?? dates), window: own };
    const plain = { ...content, hasLastDate: false, lastDate: null, caution: '' };
    if (variant === undefined)
      return [{ content: plain, dates: dated, title: told('ownDays', content.giver) }];
    const { lead, otherSigns, ifLate, giver } = variant.content;
    const timed = { ...plain, lead, otherSigns, ifLate, record: undefined };
    return [{ content: timed, dates: dated, title: told('otherDays', giver) }];
  });
  const first = { content, dates: { ...dates, window }, title: joined ? told('safeDays', '') : title };
  return [first, ...marks];
}

/** What is nothing but a marker stands among the markers, unless it has more to say. */
function needsALine({ kind, lead, otherSigns, ifLate, caution, hasLastDate }: EntryInput): boolean {
  if (kind !== 'marker-only' || (lead.type !== 'sky' && !isStarLead(lead))) return true;
  return hasLastDate || [otherSigns, ifLate, caution].some((text) => text !== '');
}

type Body = Pick<VersionEntryBody, 'content' | 'dates'>;

/** A single day gets the sign of one; a fixed date that only opens a window does not. */
function fixedDateOf({ content, dates: { window } }: Body): string | null {
  if (content.lead.type !== 'fixed-date' || window === null) return null;
  return window.bestFrom === window.bestTo ? window.bestFrom : null;
}

/** Said once: where the same office set the last date, its name stands there. */
function dateSetBy({ lead, lastDate }: EntryInput): string {
  if (lead.type !== 'fixed-date' || lead.source === lastDate?.source) return '';
  return lead.source;
}

/** The office is named where its date is the one that counts. A star may bring the last day forward, never back. */
function lastAdvisedOf({ content, dates: { window } }: Body, year: number): SheetEntry['lastAdvised'] {
  const { lastDate } = content;
  if (lastDate === null) return null;
  if (window === null) return { date: dateIn(year, lastDate.date), source: lastDate.source };
  return {
    date: window.lastAdvised,
    source: window.lastAdvisedBy === 'fixed' ? lastDate.source : '',
  };
}

function stopOf({ record }: EntryInput, year: number): NonNullable<SheetEntry['stop']> | null {
  const stop = record?.work.stop ?? null;
  return stop && { date: dateIn(year, stop.date), source: stop.source };
}

/** What one and the same person checked on one day is said once. */
function checksOf({ record }: EntryInput): SheetCheck[] {
  const found = new Map<string, SheetCheck>();
  for (const text of CHECKED_TEXTS) {
    const check = record?.checked[text] ?? null;
    if (check === null) continue;
    const { office, name, day: date } = check;
    const key = JSON.stringify([office, name, date]);
    found.set(key, { office, name, date, texts: [...(found.get(key)?.texts ?? []), text] });
  }
  return [...found.values()];
}

function reason(
  { content, dates }: Body,
  year: number,
  texts: EntryTexts,
  titles: ReadonlyMap<string, string>,
): string | null {
  const { files, words } = texts;
  const { lastDate } = content;
  if (lastDate !== null && dates.warnings.includes('window-closed-by-last-date')) {
    const date = words.day(dateIn(year, lastDate.date));
    return files('sheet.noDate.closed', { date, source: lastDate.source });
  }
  // Named only where it is on the board itself.
  const title = titles.get(anchorOf(content.lead) ?? '');
  if (title !== undefined && dates.warnings.includes('waits-for-actual-day')) {
    return files('sheet.noDate.countedFrom', { title });
  }
  return whyNoDate(dates, year, texts);
}

function dateIn(year: number, { month, day }: { month: number; day: number }): string {
  return [String(year).padStart(4, '0'), ...[month, day].map((part) => String(part).padStart(2, '0'))].join(
    '-',
  );
}
