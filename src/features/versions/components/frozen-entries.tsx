import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { wasPublished } from '#shared/calendar/version-state.js';
import { boardOf } from '#shared/calendar/variants.js';
import type { DoneSince, Version, VersionEntry, VersionHeader } from '#shared/contracts/versions.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
import { useEntryTitles } from '#src/lib/entry-titles.js';
import { BoardLine } from '#src/lib/board-line.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useEntryFacts, type FactGroup } from '#src/lib/entry-facts.js';
import { useEntryWords, windowDayNumbers, type NamesByKey } from '#src/lib/entry-words.js';
import { SignsInLine } from '#src/lib/signs-in-line.js';
import { MoreOfThem, useShownPart } from '#src/lib/shown-part.js';
import { VariantList } from '#src/lib/variant-list.js';
import { KeptLine } from '#src/lib/kept-line.js';
import { KeptChip } from '#src/lib/level-chip.js';
import { More } from '#src/ui/fold.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { WindowBar } from '#src/ui/pictures/window-bar.js';
import { Board } from '#src/ui/surfaces.js';
import { Seal } from './seal-board.js';

interface FrozenEntriesProps {
  version: Version;
  about?: ((entry: VersionEntry) => ReactNode) | undefined;
}

/** The entries of a version in their order, each with its days; everything else one press away. */
export function FrozenEntries({ version, about }: FrozenEntriesProps) {
  const { t } = useTranslation('versions');
  const { header, entries } = version;
  const { shown, left, more } = useShownPart(entries);
  const markers: NamesByKey = new Map(header.markers.map((marker) => [marker.markerKey, marker]));
  return (
    <Board title={t('page.entries')}>
      <p className="text-small text-umber-soft">{t('page.entriesHint')}</p>
      <ol className="frozen-entries">
        {shown.map((entry) => (
          <li key={entry.entryId}>
            <FrozenEntry
              entry={entry}
              header={header}
              // Signs are marked as seen where people may go by the entry.
              calendarId={wasPublished(version.state) ? version.calendarId : null}
              markers={markers}
              done={version.doneSince?.find(({ entryId }) => entryId === entry.entryId)}
              about={about}
            />
          </li>
        ))}
      </ol>
      <MoreOfThem left={left} more={more} />
      <KeptLine keptCount={version.keptCount} withdrawnCount={version.withdrawnCount} />
    </Board>
  );
}

interface FrozenEntryProps {
  entry: VersionEntry;
  header: VersionHeader;
  calendarId: string | null;
  markers: NamesByKey;
  /** What was done since, where it is counted from that. */
  done: DoneSince | undefined;
  about: FrozenEntriesProps['about'];
}

function FrozenEntry({ entry, header, calendarId, markers, done, about }: FrozenEntryProps) {
  const words = useEntryWords();
  const dateWords = useDateWords();
  const { content, dates } = entry;
  const { year } = header;
  const board = boardOf(entry).window;
  return (
    <div className="frozen-entry">
      <SignIcon sign={content.icon} size={34} />
      <div className="min-w-0">
        <h3 className="text-body">
          {content.titleOfficer}
          {content.titleVillage !== '' && (
            <span className="own-words text-umber-soft" lang={header.villageLanguage.tag}>
              {' · '}
              {content.titleVillage}
            </span>
          )}
        </h3>
        <KeptChip level={content.sharingLevel} details={content.sharing} />
        <p className="range-line">
          <strong>{words.window(content, dates.window, year)}</strong>
        </p>
        <p className="range-line">{words.lead(content, markers)}</p>
        {done && <DoneLine done={done} content={content} year={year} />}
        {board && (
          <WindowBar
            className="mt-2"
            span={{ first: dayNumberOf(year, 1, 1), last: dayNumberOf(year, 12, 31) }}
            days={windowDayNumbers(board)}
            kind={content.protectiveWatch ? 'watch' : 'work'}
            label=""
            height={9}
            monthStarts={dateWords
              .months(year)
              .slice(1)
              .map(({ dayNumber }) => dayNumber)}
          />
        )}
        <SignsInLine
          record={content.record}
          window={board ?? null}
          year={year}
          home={calendarId === null ? undefined : { calendarId, entryId: entry.entryId }}
        />
        <BesideIt entry={entry} year={year} markers={markers} />
        <EntryRest entry={entry} year={year} markers={markers} />
        {about?.(entry)}
      </div>
    </div>
  );
}

/** Said beside what was frozen, never in its place. */
function DoneLine({
  done: { anchorId, from, to, window },
  content,
  year,
}: {
  done: DoneSince;
  content: VersionEntry['content'];
  year: number;
}) {
  const { t } = useTranslation(['versions', 'anchors']);
  const words = useEntryWords();
  const dates = useDateWords();
  const title = useEntryTitles().get(anchorId) ?? t('anchors:another');
  const days = to === null ? dates.day(from) : dates.range(from, to);
  return (
    <p className="range-line">
      {t('page.doneSince', { title, days, window: words.window(content, window, year) })}
    </p>
  );
}

/** Other keepers' timings, and the days by which the board goes where they are not the entry's own. */
function BesideIt({ entry, year, markers }: { entry: VersionEntry; year: number; markers: NamesByKey }) {
  if (entry.variants === undefined) return null;
  return (
    <div className="mt-2 grid gap-2">
      <BoardLine entry={entry} />
      <VariantList variants={entry.variants} year={year} markers={markers} />
    </div>
  );
}

const GROUPS: readonly FactGroup[] = ['what', 'when', 'signs', 'work', 'trust', 'whose'];

function EntryRest({ entry, year, markers }: { entry: VersionEntry; year: number; markers: NamesByKey }) {
  const { t } = useTranslation('versions');
  const facts = useEntryFacts().groups(entry.content, entry.dates, year, markers);
  return (
    <More label={t('page.moreOfIt')}>
      <dl>
        {GROUPS.flatMap((group) => facts[group]).map(({ key, label, value }) => (
          <div key={key} className="fact">
            <dt>{label}</dt>
            <dd>{value}</dd>
          </div>
        ))}
        <div className="fact">
          <dt>{t('page.seal')}</dt>
          <dd>
            <Seal hash={entry.hash} />
          </dd>
        </div>
        <div className="fact">
          <dt>{t('seal.salt')}</dt>
          <dd>
            <Seal hash={entry.salt} />
          </dd>
        </div>
      </dl>
    </More>
  );
}
