import { useTranslation } from 'react-i18next';
import { ASKING_WAYS } from '#shared/contracts/consents.js';
import { TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import type { ConsentForm } from '../model/use-consent-form.js';
import { TickSet } from './tick-set.js';

/** When, where and how they were asked, and who explained it. Givers who speak for themselves need only the day. */
export function HowFields({ form: { draft, change, at }, isMine }: { form: ConsentForm; isMine: boolean }) {
  const { t } = useTranslation('consents');
  return (
    <Board title={t('form.how')}>
      <div className="grid gap-4 mid:grid-cols-2">
        <TextField
          type="date"
          label={t('form.askedOn')}
          value={draft.askedOn}
          problem={at('askedOn')}
          onChange={(event) => {
            change({ askedOn: event.currentTarget.value });
          }}
        />
        <TextField
          label={t('form.askedWhere')}
          value={draft.askedWhere}
          problem={at('askedWhere')}
          onChange={(event) => {
            change({ askedWhere: event.currentTarget.value });
          }}
        />
        {!isMine && (
          <>
            <TickSet
              label={t('form.askedHow')}
              values={ASKING_WAYS}
              words={(way) => t(`way.${way}`)}
              chosen={draft.askedHow}
              onChange={(askedHow) => {
                change({ askedHow });
              }}
            />
            <TextField
              label={t('form.language')}
              value={draft.language ?? ''}
              problem={at('language')}
              onChange={(event) => {
                const tag = event.currentTarget.value.trim();
                change({ language: tag === '' ? null : tag });
              }}
            />
            <TextField
              label={t('form.explainedBy')}
              value={draft.explainedBy}
              problem={at('explainedBy')}
              onChange={(event) => {
                change({ explainedBy: event.currentTarget.value });
              }}
            />
            <TextField
              label={t('form.explanation')}
              hint={t('form.explanationHint')}
              value={draft.explanation}
              problem={at('explanation')}
              onChange={(event) => {
                change({ explanation: event.currentTarget.value });
              }}
            />
          </>
        )}
      </div>
    </Board>
  );
}
