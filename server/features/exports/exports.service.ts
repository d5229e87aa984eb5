import type { CsvQuery, IcsQuery } from '#shared/contracts/exports.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import type { DataSource } from 'typeorm';
import { seesDrafts, type Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { fileNameOf } from '../../print/file-name.js';
import { translatorFor } from '../../print/translator.js';
import type { ListedMediaService } from '../attachments/listed-media.service.js';
import { seasonToCarry } from '../season-reviews/carried-season.service.js';
import type { CalendarContent, FrozenContentService } from '../versions/frozen-content.service.js';
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

  async csv(actor: Actor, calendarId: string, number: string, { mark }: CsvQuery): Promise<ExportedFile> {
    const content = await this.contents.readForUse(actor, calendarId, number, 'feed');
    const text = calendarCsv(content, { mark: mark === 'yes', levels: seesDrafts(actor) });
    return { content: text, fileName: nameOf(content, 'csv') };
  }

  /** The whole of it, to be read back. */
  async json(actor: Actor, calendarId: string, number: string): Promise<ExportedFile> {
    const content = await this.contents.readForUse(actor, calendarId, number, 'feed');
    const ids = content.entries.map(({ entryId }) => entryId);
    const media = await this.media.of(actor.communityId, ids);
    // What a year taught is for those who read drafts.
    const season = seesDrafts(actor)
      ? await seasonToCarry(this.dataSource.manager, calendarId, ids)
      : { lessons: [], decisions: [] };
    const file = calendarFileOf(content, calendarId, this.clock.now(), { media, season });
    return { content: JSON.stringify(file, null, 1), fileName: nameOf(content, 'json') };
  }
}

/** `Upper Tazimel 2027-1 calendar.ics`; what is not published says so in its name. */
function nameOf({ header, label, state }: CalendarContent, extension: string): string {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const published = state === 'published' ? label : null;
  const issue = published ?? [String(header.year), t(`ics.state.${state ?? 'draft'}`)].join(' ');
  return fileNameOf(t('ics.fileName', { community: header.communityName, issue }), extension);
}
