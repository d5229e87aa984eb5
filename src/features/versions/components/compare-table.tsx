import { useTranslation } from 'react-i18next';
import type { EntryComparison, VersionEntryBody } from '#shared/contracts/versions.js';
import { Table } from '#src/ui/table.js';
import { aboutTopic, topicOf, type ChangeTopic } from '../model/change-topics.js';
import { differing } from '../model/entry-change.js';
import type { CompareWords } from '../model/entry-sentences.js';
import { SHOWN_FIELDS, type ShownField } from '../model/shown-fields.js';
import { useFieldValue } from './use-field-value.js';

interface CompareTableProps {
  entries: readonly EntryComparison[];
  words: CompareWords;
  topic: ChangeTopic | null;
}

/** Every difference as a row: the entry, what it is about, before and now. */
export function CompareTable({ entries, words, topic }: CompareTableProps) {
  const { t } = useTranslation('versions');
  const valueOf = useFieldValue(words);
  const value = (field: ShownField, body: VersionEntryBody | null) =>
    (body && valueOf(field, body)) || <span className="text-umber-soft">{t('compare.empty')}</span>;
  return (
    <Table className="side-by-side" caption={t('compare.tableCaption')}>
      <thead>
        <tr>
          <th scope="col">{t('compare.entry')}</th>
          <th scope="col">{t('compare.field')}</th>
          <th scope="col">{t('compare.before')}</th>
          <th scope="col">{t('compare.now')}</th>
        </tr>
      </thead>
      <tbody>
        {aboutTopic(differing(entries), topic).flatMap((entry) =>
          fieldsOf(entry, topic).map((field, index, fields) => (
            <tr key={`${entry.entryId} ${field}`}>
              {index === 0 && (
                <th scope="rowgroup" rowSpan={fields.length}>
                  {entry.titleOfficer}
                </th>
              )}
              <td>{t(`fieldName.${field}`)}</td>
              <td data-label={t('compare.before')}>{value(field, entry.before)}</td>
              <td data-label={t('compare.now')}>{value(field, entry.after)}</td>
            </tr>
          )),
        )}
      </tbody>
    </Table>
  );
}

/** A new or a gone entry differs in all that matters: what it goes by and its days. */
function fieldsOf(entry: EntryComparison, topic: ChangeTopic | null): ShownField[] {
  const fields = allFieldsOf(entry);
  return topic === null || entry.change !== 'changed'
    ? fields
    : fields.filter((field) => topicOf(field) === topic);
}

function allFieldsOf(entry: EntryComparison): ShownField[] {
  if (entry.change !== 'changed') return ['lead', 'window'];
  const names = entry.fields.map(({ field }) => field.replace(/^dates\./u, ''));
  const found = SHOWN_FIELDS.filter(
    (field) => names.includes(field) || (field === 'lastDate' && names.includes('hasLastDate')),
  );
  return found.length > 0 ? found : ['window'];
}
