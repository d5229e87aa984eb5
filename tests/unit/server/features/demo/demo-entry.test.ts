import { parse } from 'csv-parse/sync';
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { withKnownWork } from '#server/features/demo/demo-entry.js';
import { WITHHELD_ENTRY } from '#server/features/demo/tazimel-beside.data.js';
import { WITHHELD_CODE } from '#server/features/demo/tazimel-consents.data.js';
import { TAZIMEL_ENTRIES } from '#server/features/demo/tazimel-entries.data.js';
import { TAZIMEL_WEEDING } from '#server/features/demo/tazimel-weeding.data.js';
import { BERRY_WEEK, THOLMERE_ENTRIES } from '#server/features/demo/tholmere-entries.data.js';
import { LAMP_EVENING, VARDESCA_ENTRIES } from '#server/features/demo/vardesca-entries.data.js';

/** `tests/fixtures/demo/demo-events.csv`: the event list of the three invented villages. */
const LIST = parse<Record<string, string>>(
  readFileSync(new URL('../../../../fixtures/demo/demo-events.csv', import.meta.url)),
  { columns: true, bom: true },
);
const SEEDED = [
  ...TAZIMEL_ENTRIES,
  ...TAZIMEL_WEEDING,
  { code: WITHHELD_CODE, content: WITHHELD_ENTRY },
  ...VARDESCA_ENTRIES,
  LAMP_EVENING,
  ...THOLMERE_ENTRIES,
  BERRY_WEEK,
];
const SAID_ELSEWHERE = '(title withheld)';

it('holds every line of the event list, under its title', () => {
  const titles = new Map(SEEDED.map(({ code, content }) => [code, content.titleOfficer]));
  expect([...titles.keys()].sort()).toEqual(LIST.map(({ id }) => id).sort());
  for (const { id = '', title } of LIST) {
    if (title !== SAID_ELSEWHERE) expect([id, titles.get(id)]).toEqual([id, title]);
  }
});

it('counts from the same days as the event list', () => {
  for (const { id = '', offset_from_days: from, offset_to_days: to } of LIST) {
    const { content } = SEEDED.find(({ code }) => code === id) ?? {};
    const { bestFromDays, bestToDays } = content?.offsets ?? {};
    expect([id, bestFromDays, bestToDays]).toEqual([id, Number(from), Number(to)]);
  }
});

it('hangs on work that is really done where the list says so', () => {
  const waiting = LIST.filter(({ anchor = '' }) => anchor.startsWith('Actual ')).map(({ id }) => id);
  const hung = SEEDED.filter(({ content }) => content.lead.type === 'entry-actual').map(({ code }) => code);
  expect(hung).toEqual(waiting);
});

it('refuses to hang an entry on work that is not there yet', () => {
  const [first] = TAZIMEL_WEEDING;
  if (!first) throw new Error('no weeding');
  expect(() => withKnownWork(first.content, new Map())).toThrow(/A04/u);
});
