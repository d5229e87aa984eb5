import { anchoredDates } from '#shared/calendar/anchors.js';
import { rolledWindow } from '#shared/calendar/rolled-window.js';
import type { EntryWindow } from '#shared/contracts/calendars.js';
import type { EngineDifference, TodaysEngine } from '#shared/contracts/todays-engine.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { canonicalJson, sameJson } from '#shared/kernel/canonical-json.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import type { DataSource } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import type { SkyDatesService } from '../calendars/sky-dates.service.js';
import { frozenContent, visibleVersion, type FrozenContentService } from './frozen-content.service.js';

type Windows = ReadonlyMap<string, EntryWindow | null>;

/** Versions of which what today's engine says is kept. */
const KEPT_VERSIONS = 32;

/** Holds a version against today's engine. It never changes what was frozen: the village goes by that. */
export class TodaysEngineService {
  private readonly kept = new Map<string, Windows>();

  constructor(
    private readonly dataSource: DataSource,
    private readonly contents: FrozenContentService,
    private readonly sky: SkyDatesService,
  ) {}

  async read(actor: Actor, calendarId: string, number: number): Promise<TodaysEngine> {
    const seen = await this.contents.read(actor, calendarId, String(number));
    const frozenBy = seen.header.engineVersion;
    const found = { frozenBy, today: ENGINE_VERSION, entryCount: seen.entries.length };
    if (frozenBy === ENGINE_VERSION) return { ...found, differences: [] };
    const { manager } = this.dataSource;
    const version = await visibleVersion(manager, actor, calendarId, number);
    // Reckoned whole, for what hangs on each other; told as far as it is seen.
    const whole = await frozenContent(manager, version);
    const windows = this.windowsOf(version.id, whole.header, whole.entries);
    const differences = seen.entries.flatMap((entry) =>
      differenceOf(entry, windows.get(entry.entryId) ?? null),
    );
    return { ...found, differences: differences.toSorted((a, b) => size(b) - size(a)) };
  }

  private windowsOf(
    versionId: string,
    { place, year }: VersionHeader,
    entries: readonly VersionEntryBody[],
  ): Windows {
    // A withdrawal can change by what an entry goes; everything else of a version stands still.
    const key = canonicalJson([versionId, entries.map(({ entryId, content }) => [entryId, content.lead])]);
    const windows = this.kept.get(key) ?? this.reckon(place, year, entries);
    this.kept.delete(key);
    this.kept.set(key, windows);
    const [oldest] = this.kept.keys();
    if (this.kept.size > KEPT_VERSIONS && oldest !== undefined) this.kept.delete(oldest);
    return windows;
  }

  /** Work counted from what was done keeps the days that were known then; what was hidden stays hidden. */
  private reckon(place: VersionHeader['place'], year: number, entries: readonly VersionEntryBody[]): Windows {
    const own = this.sky.datesOf(
      place,
      year,
      entries.map(({ content }) => content),
    );
    const frozen = new Map(entries.map(({ entryId, dates }) => [entryId, dates]));
    const doneOf = new Map(
      entries.flatMap(({ content: { lead }, dates: { counted } }) =>
        lead.type === 'entry-actual' && counted?.basis === 'actual' && counted.from !== null
          ? [[lead.entryId, { from: counted.from, to: counted.to }] as const]
          : [],
      ),
    );
    const dated = anchoredDates(
      entries.map(({ entryId: id, content }, index) => ({
        ...{ id, lead: content.lead, timing: content, dates: own[index] ?? null },
      })),
      year,
      {
        mayHang: (id) => frozen.get(id)?.counted?.basis !== 'gone',
        actualOf: (id) => doneOf.get(id) ?? null,
      },
    );
    return new Map([...dated].map(([id, dates]) => [id, dates?.window ?? null]));
  }
}

function differenceOf(
  { entryId, content, dates: { window: frozen } }: VersionEntryBody,
  today: EntryWindow | null,
): EngineDifference[] {
  if (sameJson(frozen, today)) return [];
  const { titleOfficer, protectiveWatch } = content;
  const { movedDays: days } = rolledWindow(frozen, today, 0);
  return [{ entryId, titleOfficer, protectiveWatch, frozen, today, days }];
}

/** Days that came or went count as more than any number. */
function size({ days }: EngineDifference): number {
  return days === null ? Infinity : Math.abs(days);
}
