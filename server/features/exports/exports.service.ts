import type { CsvQuery, IcsQuery, TakeAlong } from '#shared/contracts/exports.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import type { DataSource } from 'typeorm';
import { seesDrafts, type Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { fileNameOf } from '../../print/file-name.js';
import { translatorFor } from '../../print/translator.js';
import type { Readable } from 'node:stream';
import type { ListedMediaService, ListedMedium } from '../attachments/listed-media.service.js';
import { seasonToCarry } from '../season-reviews/carried-season.service.js';
import type { CalendarContent, FrozenContentService } from '../versions/frozen-content.service.js';
import { packCalendar } from './calendar-archive.js';
import { calendarCsv } from './calendar-csv.js';
import { calendarFileOf } from './calendar-file.service.js';
import { calendarIcs } from './calendar-ics.js';

interface ExportedFile {
  content: string;
  fileName: string;
}

/** Files to take along. They hold what the village's board may hold and what was agreed to be put into calendars. */
export class ExportsService {
  constructor(
    private readonly contents: FrozenContentService,
    private readonly clock: Clock,
    private readonly media: ListedMediaService,
    private readonly dataSource: DataSource,
  ) {}

  async ics(actor: Actor, calendarId: string, number: string, query: IcsQuery): Promise<ExportedFile> {
    const content = await this.contents.readForUse(actor, calendarId, number, 'feed');
    return { content: calendarIcs(content, query.alarmDays ?? null), fileName: nameOf(content, 'ics') };
  }

  async csv(
    actor: Actor,
    calendarId: string,
    number: string,
    { mark, language }: CsvQuery,
  ): Promise<ExportedFile> {
    const content = await this.contents.readForUse(actor, calendarId, number, 'feed');
    const text = calendarCsv(content, { mark: mark === 'yes', language, levels: seesDrafts(actor) });
    return { content: text, fileName: nameOf(content, 'csv') };
  }

  /** The whole of it, to be read back. */
  async json(actor: Actor, calendarId: string, number: string): Promise<ExportedFile> {
    const { json, content } = await this.whole(actor, calendarId, number);
    return { content: json, fileName: nameOf(content, 'json') };
  }

  /** The same, with the voices and pictures that it lists. */
  async archive(
    actor: Actor,
    calendarId: string,
    number: string,
  ): Promise<{ content: Readable; bytes: number; fileName: string }> {
    const { json, content, media, at } = await this.whole(actor, calendarId, number);
    const packed = packCalendar(
      { fileName: nameOf(content, 'json'), json, at },
      await this.media.files(media),
    );
    return { ...packed, fileName: nameOf(content, 'zip') };
  }

  /** What would go along, before any of it is read. */
  async takeAlong(actor: Actor, calendarId: string, number: string): Promise<TakeAlong> {
    const { entries } = await this.contents.readForUse(actor, calendarId, number, 'feed');
    const ids = entries.map(({ entryId }) => entryId);
    const listed = await this.media.rows(this.dataSource.manager, actor.communityId, ids);
    const voices = listed.filter(({ row }) => row.kind === 'recording').length;
    const sizes = listed.flatMap(({ told }) => told.map(({ bytes }) => bytes));
    return {
      ...{ voices, pictures: listed.length - voices },
      bytes: sizes.reduce((sum, bytes) => sum + bytes, 0),
      stays: await this.media.countStaying(actor, ids, listed),
    };
  }

  private async whole(
    actor: Actor,
    calendarId: string,
    number: string,
  ): Promise<{ json: string; content: CalendarContent; media: ListedMedium[]; at: Date }> {
    const content = await this.contents.readForUse(actor, calendarId, number, 'feed');
    const ids = content.entries.map(({ entryId }) => entryId);
    const media = await this.media.of(actor.communityId, ids);
    // What a year taught is for those who read drafts.
    const season = seesDrafts(actor)
      ? await seasonToCarry(this.dataSource.manager, calendarId, ids)
      : { lessons: [], decisions: [] };
    const at = this.clock.now();
    const listed = media.map(({ medium }) => medium);
    const file = calendarFileOf(content, calendarId, at, { media: listed, season });
    return { json: JSON.stringify(file, null, 1), content, media, at };
  }
}

/** `Upper Tazimel 2027-1 calendar.ics`; what is not published says so in its name. */
function nameOf({ header, label, state }: CalendarContent, extension: string): string {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const published = state === 'published' ? label : null;
  const issue = published ?? [String(header.year), t(`ics.state.${state ?? 'draft'}`)].join(' ');
  return fileNameOf(t('ics.fileName', { community: header.communityName, issue }), extension);
}
