import { useTranslation } from 'react-i18next';
import { signOffNeeds } from '#shared/calendar/sign-off-needs.js';
import { More } from '#src/ui/fold.js';
import { Well } from '#src/ui/surfaces.js';
import type { FormState } from '../model/form-state.js';

/**
 * What the entry still has to say before elders are asked about it. Nothing of it keeps a draft from being saved, and an
 * elder's own entry is asked for nothing before its record is begun.
 */
export function RecordNeeds({ form, isOlder }: { form: FormState; isOlder: boolean }) {
  const { t } = useTranslation('record');
  const { content, isKeepers } = form;
  const needs = signOffNeeds(content, isOlder);
  if (isOlder && content.record === undefined && needs.length === 0)
    return <p className="mt-3 text-small text-umber-soft">{t('needs.hint')}</p>;
  if (needs.length === 0 || (isKeepers && content.record === undefined)) return null;
  return (
    <Well className="mt-3">
      <More label={t('needs.title', { count: needs.length })}>
        <ul className="list-disc ps-6">
          {needs.map((need) => (
            <li key={need}>{t(`needs.need.${need}`)}</li>
          ))}
        </ul>
      </More>
      <p className="text-small text-umber-soft">{t('needs.draft')}</p>
    </Well>
  );
}
