import { useTranslation } from 'react-i18next';
import type { EventRecord } from '#shared/contracts/event-record.js';
import { useRecordFacts } from './record-facts.js';

const GROUPS = ['what', 'when', 'signs', 'work', 'trust', 'whose'] as const;

/** A record to be read: everything that is said, group by group. */
export function RecordReading({ record }: { record: EventRecord | undefined }) {
  const { t } = useTranslation('calendars');
  const facts = useRecordFacts();
  if (record === undefined) return null;
  const groups = facts(record);
  return (
    <div className="grid gap-3">
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
