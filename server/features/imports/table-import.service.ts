import type { EntryInput } from '#shared/contracts/calendars.js';
import type { ReadLine, TableImport, TableInput } from '#shared/contracts/imports.js';
import { texts } from '#shared/locales/en/problems.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { AppError, type FieldCode } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { viewerOf } from '../../policy/viewer.js';
import { toPlaceSnapshot } from '../places/place-snapshot.service.js';
import { knowsMarker, markerKeyOfLead, type SkyDatesService } from '../calendars/sky-dates.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { knownWords } from '../word-lists/known-words.service.js';
import { IMPORT_WORDS, markerKeysByName, SEASONS, villageKinds } from './import-words.js';
import { landOnce } from './landing.service.js';
import { entryOfLine } from './table-line.js';

interface Read {
  lines: ReadLine[];
  /** In the order of the lines; those with something the matter are missing. */
  contents: EntryInput[];
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
      const { lines, contents } = await this.read(manager, actor, calendar, input);
      return { added: contents.length, lines };
    }
    const at = this.clock.now();
    let lines: ReadLine[] = [];
    const { added } = await inTransaction(this.dataSource, (within) =>
      landOnce(within, actor, calendarId, { key: input.key, at }, async () => {
        const read = await this.read(within, actor, calendar, input);
        expectAllGood(read.lines);
        lines = read.lines;
        const entries = read.contents.map((content) => ({
          ...{ id: randomUUID(), content, sameAs: null, variants: [] },
        }));
        return { way: 'table', entries, refused: 0 };
      }),
    );
    return { added, lines };
  }

  private async read(
    manager: EntityManager,
    actor: Actor,
    { placeId, year }: CalendarEntity,
    { lines, dayOrder }: TableInput,
  ): Promise<Read> {
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const figures = await figuresSeenBy(manager, viewer);
    const facts = {
      ...{ words: IMPORT_WORDS, dayOrder, calendarYear: year },
      ...{ markerKeyOf: markerKeysByName(figures), signKeyOf: SEASONS },
      villageKinds: villageKinds(await knownWords(manager, actor.communityId)),
    };
    const read = lines.map((line) => {
      const { content, problems } = entryOfLine(line, facts);
      const markerKey = content && markerKeyOfLead(content.lead);
      if (content === null || markerKey === null || knowsMarker(markerKey, figures)) {
        return { line, content, problems };
      }
      return { line, content: null, problems: [{ column: 'leadMarker' as const, code: 'unknown-marker' }] };
    });
    const contents = read.flatMap(({ content }) => content ?? []);
    const place = toPlaceSnapshot(await manager.findOneByOrFail(PlaceEntity, { id: placeId }));
    const dates = this.sky.datesOf({ ...place, figures }, year, contents);
    const datesOf = new Map(contents.map((content, index) => [content, dates[index]]));
    return {
      contents,
      lines: read.map(({ line: { line, cells }, content, problems }) => {
        const own = content ? datesOf.get(content) : undefined;
        return {
          line,
          title: (cells.titleOfficer ?? '').trim() || (cells.titleVillage ?? '').trim(),
          protectiveWatch: content?.protectiveWatch ?? false,
          window: own?.window ?? null,
          warnings: own?.warnings ?? [],
          problems,
        };
      }),
    };
  }
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
