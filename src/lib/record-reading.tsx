import { useTranslation } from 'react-i18next';
import type { EventRecord } from '#shared/contracts/event-record.js';
import { SignMarks } from '#src/ui/pictures/sign-marks.js';
import { useRecordFacts } from './record-facts.js';

const GROUPS = ['what', 'when', 'signs', 'work', 'trust', 'whose'] as const;

/** A record to be read: how many signs are needed as marks, then everything that is said, group by group. */
export function RecordReading({ record }: { record: EventRecord | undefined }) {
  const { t } = useTranslation(['calendars', 'record']);
  const facts = useRecordFacts();
  if (record === undefined) return null;
  const groups = facts(record);
  const { needed, list } = record.signs;
  return (
    <div className="grid gap-3">
      {needed !== null && (
        <p>
          <SignMarks
            needed={needed}
            total={list.length}
            label={t('record:signs.neededForEars', { count: needed, total: list.length })}
          />
        </p>
      )}
      {GROUPS.filter((group) => groups[group].length > 0).map((group) => (
        <section key={group} className="fact-group">
          <h2 className="text-body text-umber-soft">{t(`form.group.${group}`)}</h2>
          <dl>
            {groups[group].map(({ key, label, value }) => (
              <div key={key} className="fact">
                <dt>{label}</dt>
                <dd>{value}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
    </div>
  );
}
