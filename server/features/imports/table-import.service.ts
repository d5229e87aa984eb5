import { anchoredDates } from '#shared/calendar/anchors.js';
import { plainWords } from '#shared/calendar/import-dates.js';
import type { EntryDates } from '#shared/contracts/calendars.js';
import type { ReadLine, TableImport, TableInput } from '#shared/contracts/imports.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import { texts } from '#shared/locales/en/problems.js';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { AppError, type FieldCode } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { actualRows } from '../actual-days/known-days.service.js';
import { readDraft, type Draft } from '../calendars/draft.service.js';
import { knowsMarker, markerKeyOfLead, type SkyDatesService } from '../calendars/sky-dates.service.js';
import { figureKeysByName, figuresSeenBy } from '../figures/village-figures.service.js';
import { knownWords } from '../word-lists/known-words.service.js';
import { markerKeysByName, TABLE_WORDS, villageKinds, villageOperations } from './import-words.js';
import { landOnce, type LandingEntry } from './landing.service.js';
import type { TableFacts } from './table-cells.js';
import { tablePlan, type DraftTitle, type PlannedLine } from './table-plan.js';
import { villageSignsOf } from './village-signs.service.js';

interface Read {
  lines: ReadLine[];
  /** In the order of the lines; those with something the matter are missing. */
  entries: LandingEntry[];
}

/** Lines of somebody's table, as entries of a draft. */
export class TableImportService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
  ) {}

  async bringIn(actor: Actor, calendarId: string, input: TableInput): Promise<TableImport> {
    const { manager } = this.dataSource;
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    if (input.dryRun) {
      if (calendar.outNumber !== null) throw new AppError('draft-locked');
      const { lines, entries } = await this.read(manager, actor, calendar, input);
      return { added: entries.length, lines };
    }
    const at = this.clock.now();
    let lines: ReadLine[] = [];
    const { added } = await inTransaction(this.dataSource, (within) =>
      landOnce(within, actor, calendarId, at, async () => {
        const read = await this.read(within, actor, calendar, input);
        expectAllGood(read.lines);
        lines = read.lines;
        return { way: 'table', entries: read.entries, refused: 0 };
      }),
    );
    return { added, lines };
  }

  private async read(
    manager: EntityManager,
    actor: Actor,
    calendar: CalendarEntity,
    { lines, dayOrder, natureSigns }: TableInput,
  ): Promise<Read> {
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const figures = await figuresSeenBy(manager, viewer);
    const draft = await readDraft(manager, this.sky, calendar);
    const ownWords = await knownWords(manager, actor.communityId);
    const listedSigns = await villageSignsOf(manager, viewer);
    const facts: TableFacts = {
      ...{ kinds: TABLE_WORDS.kinds, yes: TABLE_WORDS.yes, codes: TABLE_WORDS.codes },
      ...{
        villageKinds: villageKinds(ownWords),
        villageOperations: villageOperations(ownWords),
        listedSigns,
      },
      ...{ words: TABLE_WORDS.dates, dayOrder, calendarYear: calendar.year },
      markerKeyOf: markerKeysByName(figures, await figureKeysByName(manager, viewer)),
      latitudeDeg: draft.place.latitudeDeg,
      natureSigns: new Map([
        ...[...listedSigns].map(([plain, { name }]) => [plain, name] as const),
        ...natureSigns.map((name) => [plainWords(name), name.trim()] as const),
      ]),
    };
    const planned = tablePlan(lines, facts, await titlesForAll(manager, viewer, draft)).map((line) =>
      withKnownMarker(line, figures),
    );
    const entries = planned.flatMap(({ entry }) => entry ?? []);
    const dates = await this.datesOf(manager, calendar.year, draft, figures, entries);
    return {
      entries,
      lines: planned.map(({ line: { line, cells }, entry, problems }) => {
        const own = entry ? dates.get(entry.id) : undefined;
        return {
          line,
          title: (cells.titleOfficer ?? '').trim() || (cells.titleVillage ?? '').trim(),
          protectiveWatch: entry?.content.protectiveWatch ?? false,
          lead: entry?.content.lead ?? null,
          window: own?.window ?? null,
          warnings: own?.warnings ?? [],
          problems: [...problems],
        };
      }),
    };
  }

  /** As the draft would have them with all these lines in it. */
  private async datesOf(
    manager: EntityManager,
    year: number,
    draft: Draft,
    figures: SkyFigure[],
    entries: readonly LandingEntry[],
  ): Promise<Map<string, EntryDates | null>> {
    const own = this.sky.datesOf(
      { ...draft.place, figures },
      year,
      entries.map(({ content }) => content),
    );
    const actual = await actualRows(
      manager,
      draft.entries.map(({ row }) => row.id),
    );
    const known = draft.entries.map(({ row: { id, content }, dates }) => ({ id, content, dates }));
    const coming = entries.map(({ id, content }, index) => ({ id, content, dates: own[index] ?? null }));
    return anchoredDates(
      [...known, ...coming].map(({ id, content, dates }) => ({
        ...{ id, lead: content.lead, timing: content, dates },
      })),
      year,
      {
        mayHang: () => true,
        actualOf: (id) => {
          const row = actual.get(id);
          return row ? { from: row.firstDay, to: row.lastDay } : null;
        },
      },
    );
  }
}

/** Entries of the draft on which others may hang: those that everybody of the village sees. */
async function titlesForAll(
  manager: EntityManager,
  viewer: Viewer,
  { entries }: Draft,
): Promise<DraftTitle[]> {
  const things = entries.map(({ row }) => ({
    ...{ row, entryId: row.id, markerKey: markerKeyOfLead(row.content.lead) },
  }));
  const sight = await entrySight(manager, viewer, things);
  return things
    .filter((thing) => sight.isForVillage(thing))
    .map(({ row: { id, content } }) => ({ id, titles: [content.titleOfficer, content.titleVillage] }));
}

function withKnownMarker(planned: PlannedLine, figures: readonly SkyFigure[]): PlannedLine {
  const { entry, problems } = planned;
  const leads = entry ? [entry.content.lead, ...entry.variants.map(({ content }) => content.lead)] : [];
  const isKnown = leads.every((lead) => {
    const markerKey = markerKeyOfLead(lead);
    return markerKey === null || knowsMarker(markerKey, figures);
  });
  if (isKnown) return planned;
  return {
    ...planned,
    entry: null,
    problems: [...problems, { column: 'leadMarker', code: 'unknown-marker' }],
  };
}

/** All or nothing: one line that is not right keeps every one out. */
function expectAllGood(lines: readonly ReadLine[]): void {
  const errors = lines.flatMap(({ problems }, index) =>
    problems.map(({ column, code }) => ({
      field: `lines.${String(index)}.cells.${column}`,
      code,
      message: code in texts.field ? texts.field[code as FieldCode] : texts.field.unknown,
    })),
  );
  if (errors.length > 0) throw new AppError('invalid-input', { errors });
}
