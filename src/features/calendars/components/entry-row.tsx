import { CircleAlert, PencilLine } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { memo, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useEntryWords, windowDayNumbers } from '#src/lib/entry-words.js';
import { KeptChip } from '#src/lib/level-chip.js';
import { paths } from '#src/lib/paths.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import type { DaySpan } from '#src/ui/pictures/day-span.js';
import { WindowBar } from '#src/ui/pictures/window-bar.js';
import type { EntryAnswers } from '../model/elder-requests.js';
import type { ShownEntry } from '../model/preview-dates.js';

export interface EntryRowProps {
  entry: ShownEntry;
  calendarId: string;
  year: number;
  isOpen: boolean;
  isWide: boolean;
  answers: EntryAnswers | undefined;
  /** How many things there are to look at. */
  warnings: number;
  span: DaySpan;
  monthStarts: readonly number[];
}

/** One entry of the list. On a phone it carries its own line of the year. */
export const EntryRow = memo(function EntryRow(props: EntryRowProps) {
  const { entry, calendarId, year, isOpen, isWide, span, monthStarts } = props;
  const { t } = useTranslation('calendars');
  const words = useEntryWords();
  const { content, dates } = entry;
  return (
    <Link
      className="entry-row"
      aria-current={isOpen ? 'true' : undefined}
      to={paths.calendar(calendarId, { entry: entry.id })}
      replace={isWide}
      preventScrollReset={isWide}
    >
      <span className="ring" aria-hidden />
      <SignIcon sign={content.icon} size={34} />
      <span className="min-w-0">
        <span className="block">{content.titleOfficer || t('editor.untitled')}</span>
        <span className="range-line">
          {dates === null && content.lead.type !== 'none'
            ? t('days.notYet')
            : words.window(content, dates?.window ?? null, year)}
        </span>
        <KeptChip level={content.sharingLevel} details={content.sharing} />
        <RowMarks {...props} />
      </span>
      {!isWide && dates?.window && (
        <WindowBar
          className="entry-line"
          span={span}
          days={windowDayNumbers(dates.window)}
          kind={content.protectiveWatch ? 'watch' : 'work'}
          label=""
          height={9}
          monthStarts={monthStarts}
        />
      )}
    </Link>
  );
});

/** What is to be seen about an entry before it is opened: a sign and words each. */
function RowMarks({ entry, answers, warnings }: EntryRowProps) {
  const { t } = useTranslation('calendars');
  return (
    <>
      {entry.unsaved && (
        <Mark icon={<PencilLine aria-hidden size={18} />}>
          {t(entry.saved ? 'row.unsaved' : 'row.newUnsaved')}
        </Mark>
      )}
      {answers?.requests.map(({ answer }) =>
        answer.answer === 'change-this' ? (
          <Mark key={answer.id} icon={<StateIcon state="changes-asked" size={20} />}>
            {t('row.asksChange', { name: answer.elderName })}
          </Mark>
        ) : (
          <Mark key={answer.id} icon={<StateIcon state="not-for-the-board" size={20} />}>
            {t('row.notForBoard', { name: answer.elderName })}
          </Mark>
        ),
      )}
      {(answers?.kept.length ?? 0) > 0 && (
        <Mark icon={<StateIcon state="two-ways" size={20} />}>{t('row.kept')}</Mark>
      )}
      {warnings > 0 && (
        <Mark icon={<CircleAlert aria-hidden size={18} />}>{t('row.warnings', { count: warnings })}</Mark>
      )}
    </>
  );
}

function Mark({ icon, children }: { icon: ReactNode; children: ReactNode }) {
  return (
    <span className="mt-1 flex items-center gap-2 text-small">
      {icon}
      <span>{children}</span>
    </span>
  );
}
