import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { SignsInLine } from '#src/lib/signs-in-line.js';
import { useEntryFacts, type FactGroup } from '#src/lib/entry-facts.js';
import type { EntryAnswers } from '../model/elder-requests.js';
import type { ShownEntry } from '../model/preview-dates.js';
import type { Editor } from '../model/use-editor.js';
import { ElderRequests } from './elder-requests.js';
import { EntryHeading } from './entry-heading.js';

const GROUPS: readonly FactGroup[] = ['what', 'when', 'signs', 'work', 'trust', 'whose'];

/** The entry to be read: for those who do not write, and while the draft is locked. */
export function EntryReading({
  editor,
  entry,
  answers,
}: {
  editor: Editor;
  entry: ShownEntry;
  answers: EntryAnswers | undefined;
}) {
  const { t } = useTranslation('calendars');
  const headingId = useId();
  const facts = useEntryFacts();
  const dates = useDateWords();
  const { calendar, community, markers, lastNumber } = editor;
  const groups = facts.groups(entry.content, entry.dates, calendar.year, markers.data?.byKey ?? new Map());
  return (
    <section className="board" aria-labelledby={headingId}>
      <EntryHeading
        id={headingId}
        content={entry.content}
        villageLanguage={community?.villageLanguage ?? null}
      />
      {answers && lastNumber !== null && (
        <ElderRequests
          answers={answers}
          calendarId={calendar.id}
          number={lastNumber}
          entryId={entry.id}
          ways={null}
        />
      )}
      <div className="mt-3 grid gap-3">
        <SignsInLine
          record={entry.content.record}
          window={entry.dates?.window ?? null}
          year={calendar.year}
          home={{ calendarId: calendar.id, entryId: entry.id }}
        />
        {GROUPS.filter((group) => groups[group].length > 0).map((group) => (
          <div key={group} className="fact-group">
            <h3 className="text-body text-umber-soft">{t(`form.group.${group}`)}</h3>
            <dl>
              {groups[group].map((fact) => (
                <div key={fact.key} className="fact">
                  <dt>{fact.label}</dt>
                  <dd>{fact.value}</dd>
                </div>
              ))}
            </dl>
          </div>
        ))}
      </div>
      {entry.saved && (
        <p className="mt-3 text-small text-umber-soft">
          {t('editor.lastSaved', {
            name: entry.saved.updatedBy,
            when: dates.moment(entry.saved.updatedAt),
          })}
        </p>
      )}
    </section>
  );
}
