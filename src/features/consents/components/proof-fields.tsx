import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { Attachment } from '#shared/contracts/attachments.js';
import type { ConsentProof } from '#shared/contracts/consents.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { ClipFields } from './clip-fields.js';
import { proofsQuery } from '../api/consents-api.js';
import type { ConsentForm } from '../model/use-consent-form.js';

const KINDS = ['voice', 'mark', 'signature', 'witness'] as const;

/** What shows that they said so. A voice or a picture belongs to a consent that is written down already. */
export function ProofFields({
  form,
  communityId,
  consentId,
}: {
  form: ConsentForm;
  communityId: string;
  consentId: string | null;
}) {
  const { t } = useTranslation('consents');
  const { data: files = [] } = useQuery({
    ...proofsQuery(communityId, consentId ?? ''),
    enabled: consentId !== null,
  });
  const { draft, change, at } = form;
  const { proof } = draft;
  const hasClip = proof?.kind === 'voice' && form.voice.clip !== null;
  const set = (changed: Partial<ConsentProof>) => {
    change({ proof: { kind: 'witness', witness: '', attachmentId: null, ...proof, ...changed } });
  };
  const wanted: Attachment['kind'] = proof?.kind === 'voice' ? 'recording' : 'picture';
  const offered = files.filter(({ kind }) => kind === wanted);
  return (
    <Board title={t('form.proof')}>
      <div className="grid gap-4">
        <PickGroup
          label={t('form.proof')}
          labelForEars
          hint={t('form.proofHint')}
          value={proof?.kind ?? null}
          problem={at('proof.kind') ?? (proof === null ? at('proof') : undefined)}
          onChange={(kind) => {
            set({ kind, attachmentId: null });
          }}
          options={KINDS.map((value) => ({ value, label: t(`proof.${value}`) }))}
        />
        {proof?.kind === 'voice' && form.voice.canRecord && <ClipFields voice={form.voice} />}
        {proof !== null && proof.kind !== 'witness' && !hasClip && (
          <SelectField
            label={t('form.proofFile')}
            hint={offered.length === 0 ? t('form.proofFileHint') : undefined}
            value={proof.attachmentId ?? ''}
            problem={at('proof.attachmentId')}
            onChange={(event) => {
              set({ attachmentId: event.currentTarget.value === '' ? null : event.currentTarget.value });
            }}
          >
            <option value="">
              {t(proof.kind === 'voice' ? 'form.proofVoiceNone' : 'form.proofFileNone')}
            </option>
            {offered.map(({ id, title, speaker }) => (
              <option key={id} value={id}>
                {[title, speaker].filter((text) => text !== '').join(', ')}
              </option>
            ))}
          </SelectField>
        )}
        {proof !== null && (
          <TextField
            label={t('form.witness')}
            value={proof.witness}
            problem={at('proof.witness')}
            onChange={(event) => {
              set({ witness: event.currentTarget.value });
            }}
          />
        )}
      </div>
    </Board>
  );
}
