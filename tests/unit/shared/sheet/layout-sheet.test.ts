import fc from 'fast-check';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { isoOf } from '#shared/sheet/civil-days.js';
import { ICON_KEYS } from '#shared/sheet/icons.js';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { layoutSheet } from '#shared/sheet/layout-sheet.js';
import { SheetModelError } from '#shared/sheet/sheet-model.js';
import type { SheetEntry, SheetMarker, SheetModel } from '#shared/sheet/sheet-model.js';
import { allWords, boundsOf, faultsOf, overlap, rings, texts } from '#tests/support/sheet/page-checks.js';
import { plainMeasurer } from '#tests/support/sheet/plain-measurer.js';
import { entry, marker, upperTazimel, words } from '#tests/support/sheet/upper-tazimel-sheet.js';

// Laying out a year takes a while on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const LAYOUTS = ['month-cards', 'year-board'] as const;

function layout(change: Partial<SheetModel> = {}) {
  return layoutSheet(upperTazimel(change), fontMeasurer);
}

// Reading the typefaces for the first time is slow.
beforeAll(() => {
  layout();
}, 60_000);

describe.each(LAYOUTS)('a sheet as %s', (kind) => {
  it('has one ring for every day of the year and none more, in order', () => {
    const dates = rings(layout({ layout: kind })).map((ring) => ring.date);
    const days = Array.from({ length: 365 }, (_, index) =>
      new Date(Date.UTC(2027, 0, 1 + index)).toISOString().slice(0, 10),
    );
    expect(dates.toSorted()).toEqual(days);
  });

  it.each([
    [2024, 366],
    [2027, 365],
    [2028, 366],
    [2100, 365],
    [2000, 366],
    [1900, 365],
  ])('has in %i exactly %i rings, 29 February dashed and no other', (year, count) => {
    const model = upperTazimel({ layout: kind, year, words: words(year), label: `${year}-1` });
    const all = rings(layoutSheet(model, plainMeasurer));
    expect(all).toHaveLength(count);
    expect(all.filter((ring) => ring.dashed).map((ring) => ring.date)).toEqual(
      count === 366 ? [`${year}-02-29`] : [],
    );
  });

  it('has an empty circle to tick for each sign that is needed, and none where no sign is named', () => {
    const waits = { signs: 'wet soil, reed caller, foam', signsNeeded: 2, mustHaveSign: 'wet soil' };
    const window = { ...entry({}).window, bestFrom: '2027-06-04', bestTo: '2027-06-12' };
    const pages = (change: Partial<SheetEntry>) =>
      layout({ layout: kind, entries: [entry({ window, ...change })] });
    const ticks = (change: Partial<SheetEntry>) =>
      pages(change).flatMap(({ primitives }) =>
        primitives.filter((one) => one.type === 'disc' && one.role === 'tick' && one.fill === 'open'),
      );
    expect(ticks(waits)).toHaveLength(2);
    expect(allWords(pages(waits)).replaceAll('\n', ' ')).toContain('Not without: wet soil.');
    expect(ticks({ signs: 'as people see', signsNeeded: null })).toEqual([]);
  });

  it('prints the next leap years beside a leap day, and never without one', () => {
    const leap = layoutSheet(
      upperTazimel({ layout: kind, year: 2028, words: words(2028), label: '2028-1' }),
      plainMeasurer,
    );
    expect(allWords(leap).replaceAll('\n', ' ')).toMatch(/2032, 2036/u);
    expect(allWords(layout({ layout: kind }))).not.toMatch(/2028|2032/u);
  });

  it('keeps every word at its floor, on its page, clear of other words and of holes', () => {
    expect(layout({ layout: kind }).flatMap(faultsOf)).toEqual([]);
  });

  it('draws lines that survive two copies: none thinner than 0.35 mm', () => {
    for (const primitive of layout({ layout: kind }).flatMap((page) => page.primitives)) {
      if ('strokeMm' in primitive && primitive.strokeMm !== 0) {
        expect(primitive.strokeMm).toBeGreaterThanOrEqual(0.35);
      }
    }
  });

  it('carries on every page both 100 mm bars, the caution, the contacts, the basis, the issue and how to print', () => {
    for (const page of layout({ layout: kind })) {
      const bars = page.primitives.filter((primitive) => primitive.type === 'scale-bar');
      expect(bars.map((bar) => [bar.axis, bar.length]).toSorted()).toEqual([
        ['across', 100],
        ['down', 100],
      ]);
      const said = allWords([page]).replaceAll('\n', ' ');
      for (const text of [
        'Stars tell the season, not the rain. Check soil and forecast first.',
        'Weather service: 900. Agricultural office: 901.',
        'Dates: three-class rule',
        '2027-1',
        'Upper Tazimel',
        'not “fit to page”',
        'Peg 5\u00a0mm, drill 6\u00a0mm.',
      ]) {
        expect(said, `${page.name} lacks this`).toContain(text);
      }
    }
  });

  it('warns for the eyes on every page that names a star’s days', () => {
    for (const page of layout({ layout: kind })) {
      const names = page.primitives.some(
        (primitive) => primitive.type === 'line' && primitive.role === 'bracket' && page.kind !== 'legend',
      );
      const warns = allWords([page]).replaceAll('\n', ' ').includes('stop before the Sun shows');
      if (names) expect(warns, page.name).toBe(true);
    }
  });

  it('shows its issue in figures of 20 mm at least', () => {
    const figures = texts(layout({ layout: kind })).filter((text) => text.role === 'version-figure');
    expect(figures.length).toBeGreaterThan(0);
    for (const figure of figures) {
      expect(figure.lines[0]?.text).toBe('1');
      expect(figure.box.height).toBeGreaterThanOrEqual(20);
    }
  });

  it('writes the state across every page of what is not published, under all else and clear of words and holes', () => {
    for (const page of layout({ layout: kind, label: null, stateWatermark: 'In review' })) {
      const [first, ...rest] = page.primitives;
      expect(first).toMatchObject({ type: 'text', role: 'watermark', lines: [{ text: 'In review' }] });
      const clearings = rest.filter((primitive) => 'role' in primitive && primitive.role === 'clearing');
      for (const hole of rest.filter((primitive) => primitive.type === 'ring')) {
        const ground = boundsOf(hole);
        expect(clearings.some((clear) => holds(boundsOf(clear), ground))).toBe(true);
      }
      const mark = first && boundsOf(first);
      for (const text of texts([{ ...page, primitives: rest }])) {
        if (text.paint === 'paper' || mark === undefined || !overlap(mark, text.box)) continue;
        const line = { ...text.box, height: 1, y: text.box.y + text.box.height / 2 };
        if (text.lines.length === 1)
          expect(clearings.some((clear) => holds(boundsOf(clear), line))).toBe(true);
      }
      expect(
        page.primitives.filter((primitive) => primitive.type === 'text' && primitive.paint === 'outline'),
      ).toEqual([]);
    }
  });

  it('has no watermark where it is published', () => {
    expect(texts(layout({ layout: kind })).some((text) => text.role === 'watermark')).toBe(false);
  });

  it('refuses an unpublished sheet without its watermark', () => {
    expect(() => layout({ layout: kind, label: null, stateWatermark: null })).toThrow(SheetModelError);
    expect(() => layout({ layout: kind, label: null, stateWatermark: '  ' })).toThrow(SheetModelError);
  });

  it('is plain data: what goes to the screen as JSON comes back the same', () => {
    const pages = layout({ layout: kind });
    expect(JSON.parse(JSON.stringify(pages))).toEqual(pages);
  });

  it('names what has no date this year, with the reason', () => {
    const pages = layout({
      layout: kind,
      markers: [
        marker({
          titles: { village: '', officer: 'Vega' },
          expected: null,
          early: null,
          late: null,
          whyNoDate: 'never hidden here.',
        }),
      ],
      entries: [
        entry({
          window: { earliest: null, bestFrom: null, bestTo: null, latest: null },
          whyNoDate: 'its star has no date.',
        }),
      ],
    });
    const said = allWords(pages).replaceAll('\n', ' ');
    expect(said).toContain('never hidden here.');
    expect(said).toContain('its star has no date.');
    expect(pages.flatMap(faultsOf)).toEqual([]);
  });

  it('says every title in full somewhere, in both languages, with forty entries in one month', () => {
    const entries = crowd(40);
    const pages = layout({ layout: kind, entries });
    const said = allWords(pages).replace(/\s+/gu, ' ');
    for (const { titles } of entries) {
      for (const title of [titles.village, titles.officer]) {
        expect(said).toContain(title.normalize('NFC'));
      }
    }
    expect(pages.flatMap(faultsOf)).toEqual([]);
    expect(rings(pages)).toHaveLength(365);
  });

  it('stays within its floors, its pages and its own words for any entries at all', () => {
    fc.assert(
      fc.property(anyModel(kind), (model) => {
        const pages = layoutSheet(model, plainMeasurer);
        expect(pages.flatMap(faultsOf)).toEqual([]);
        expect(rings(pages)).toHaveLength(
          (model.year % 4 === 0 && model.year % 100 !== 0) || model.year % 400 === 0 ? 366 : 365,
        );
      }),
      { numRuns: 8, seed: 20270607, endOnFailure: true },
    );
  }, 60_000);
});

function holds(outer: { x: number; y: number; width: number; height: number }, inner: typeof outer): boolean {
  return (
    outer.x <= inner.x + 0.01 &&
    outer.y <= inner.y + 0.01 &&
    outer.x + outer.width >= inner.x + inner.width - 0.01 &&
    outer.y + outer.height >= inner.y + inner.height - 0.01
  );
}

function crowd(count: number): SheetEntry[] {
  const titles = [
    {
      village: 'የዘር ወቅት በላይኛው እርከን ላይ መዝራት',
      officer: 'Sow the upper terraces after the second rain of the season',
    },
    { village: 'ऊपरी खेतों में बाजरा बोना', officer: 'Sow millet' },
    { village: 'Ŋɔ̃́rɛ̀̃ g͡bị̄́ n᷄ŋ́ ɓ̰ a̱ ɛ̌', officer: 'Weed the second time, before the birds come back' },
  ];
  return Array.from({ length: count }, (_, index) =>
    entry({
      number: index + 1,
      titles: titles[index % titles.length] ?? { village: '', officer: 'Sow' },
      window: {
        earliest: isoOf(2027, 6, 1 + (index % 10)),
        bestFrom: isoOf(2027, 6, 4 + (index % 10)),
        bestTo: isoOf(2027, 6, 12 + (index % 10)),
        latest: isoOf(2027, 6, 20 + (index % 10)),
      },
      signs: index % 2 === 0 ? 'soil wet to a hand depth; weaver birds building' : '',
      signsNeeded: 2,
    }),
  );
}

/** Words of letters with and without marks, some far too long for a line. */
const title = fc
  .array(
    fc.constantFrom(
      'Ŋɔ̃́rɛ̀̃',
      'sow',
      'millet',
      'በላይኛው',
      'क्षत्रिय',
      'a',
      'g͡bị̄́',
      'Donaudampfschifffahrtsgesellschaftskapitän',
    ),
    {
      maxLength: 12,
    },
  )
  .map((parts) => parts.join(' ').slice(0, 120).trim());

const paragraph = fc.array(title, { maxLength: 6 }).map((parts) => parts.join('; ').slice(0, 500));

function dayNear(year: number) {
  return fc
    .integer({ min: -40, max: 405 })
    .map((offset) => new Date(Date.UTC(year, 0, 1 + offset)).toISOString().slice(0, 10));
}

function anyModel(kind: SheetModel['layout']) {
  return fc
    .record({
      year: fc.constantFrom(1900, 2027, 2028, 2032, 2200),
      firstWeekday: fc.constantFrom(1 as const, 6 as const, 7 as const),
      latitudeDeg: fc.integer({ min: -70, max: 70 }),
      draft: fc.boolean(),
      issue: fc.integer({ min: 1, max: 14 }),
      communityName: title.map((text) => text || 'Upper Tazimel'),
      placeName: title.map((text) => text || 'Upper terraces'),
      contacts: fc.record({ weather: title, agriculture: title }),
      signedBy: title,
      basis: fc.array(
        title.map((text) => text || 'Dates: a rule.'),
        { maxLength: 3 },
      ),
    })
    .chain(({ year, draft, issue, ...about }) => {
      const days = (length: number) =>
        fc.array(dayNear(year), { minLength: length, maxLength: length }).map((list) => list.toSorted());
      const anyMarker = (index: number) =>
        fc
          .record({ titles: labels, days: days(3), light: fc.constantFrom('dawn' as const, 'dusk' as const) })
          .map(({ titles, days: [early = null, expected = null, late = null], light }): SheetMarker =>
            marker({ letter: String.fromCharCode(65 + (index % 26)), titles, early, expected, late, light }),
          );
      const labels = fc.record({ village: title, officer: title.map((text) => text || 'Sow') });
      const anyEntry = (index: number) =>
        fc
          .record({
            titles: labels,
            icon: fc.constantFrom(...ICON_KEYS),
            days: days(4),
            isWatch: fc.boolean(),
            fixedDate: fc.option(dayNear(year)),
            lastDay: fc.option(dayNear(year)),
            signs: paragraph,
            ifLate: paragraph,
            caution: paragraph,
          })
          .map(
            ({ days: [earliest = null, bestFrom = null, bestTo = null, latest = null], lastDay, ...rest }) =>
              entry({
                ...rest,
                number: index + 1,
                window: { earliest, bestFrom, bestTo, latest },
                lastAdvised: lastDay === null ? null : { date: lastDay, source: 'agricultural office' },
              }),
          );
      return fc
        .record({
          markers: fc
            .integer({ min: 0, max: 8 })
            .chain((count) => fc.tuple(...indexes(count).map(anyMarker))),
          entries: fc
            .integer({ min: 0, max: 14 })
            .chain((count) => fc.tuple(...indexes(count).map(anyEntry))),
        })
        .map(({ markers, entries }) =>
          upperTazimel({
            layout: kind,
            year,
            ...about,
            words: words(year),
            label: draft ? null : `${year}-${issue}`,
            stateWatermark: draft ? 'Changes asked' : null,
            markers,
            entries,
            moon: upperTazimel().moon.map((moon) => ({ ...moon, date: `${year}${moon.date.slice(4)}` })),
            moonBegins: upperTazimel()
              .moonBegins.map((date) => `${year}${date.slice(4)}`)
              .sort(),
          }),
        );
    });
}

function indexes(count: number): number[] {
  return Array.from({ length: count }, (_, index) => index);
}
