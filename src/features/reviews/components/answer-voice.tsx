import { useTranslation } from 'react-i18next';
import { attachmentsEndpoints } from '#shared/contracts/attachments.js';
import type { Answer } from '#shared/contracts/reviews.js';
import { apiUrl } from '#src/lib/api-client.js';
import { useDateWords } from '#src/lib/date-words.js';
import { VoiceKey } from '#src/ui/voice-key.js';

const fileUrl = (attachmentId: string) =>
  apiUrl(attachmentsEndpoints.readPart, { params: { attachmentId, part: 1 } });

/** That an answer was spoken, and the voice itself for whoever may hear it. */
export function SpokenLine({
  answer: { spoken, elderName },
}: {
  answer: Pick<Answer, 'spoken' | 'elderName'>;
}) {
  const { t } = useTranslation('reviews');
  if (spoken === null) return null;
  return (
    <span className="grid gap-2">
      <span>{t(`spoken.${spoken.state}`)}</span>
      {spoken.attachmentId !== null && (
        <VoiceKey label={t('spoken.listen', { name: elderName })} source={fileUrl(spoken.attachmentId)} />
      )}
    </span>
  );
}

/** Whose hand wrote an answer down, and what shows that it is the elder's word. */
export function ProofLine({ answer }: { answer: Answer }) {
  const { t } = useTranslation('reviews');
  const words = useDateWords();
  const { proof, recordedByName, elderName, witness } = answer;
  if (proof === null || recordedByName === null) return null;
  const [year = 0, month = 1, day = 1] = (proof.on ?? '').split('-').map(Number);
  return (
    <span className="grid gap-2 text-small text-umber-soft">
      <span>
        {t(`proof.${proof.kind}`, {
          recorder: recordedByName,
          name: elderName,
          witness: witness ?? '',
          day: proof.on === null ? '' : words.day({ year, month, day }),
        })}
        {proof.attachmentId === null && (proof.kind === 'voice' || proof.kind === 'paper')
          ? ` ${t('proof.gone')}`
          : ''}
      </span>
      {proof.attachmentId !== null && proof.kind === 'voice' && (
        <VoiceKey label={t('proof.listen', { name: elderName })} source={fileUrl(proof.attachmentId)} />
      )}
      {proof.attachmentId !== null && proof.kind === 'paper' && (
        <a className="btn quiet" href={fileUrl(proof.attachmentId)} target="_blank" rel="noreferrer">
          {t('proof.see')}
        </a>
      )}
    </span>
  );
}
