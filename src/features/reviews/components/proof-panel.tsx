import { Mic, Square } from 'lucide-react';
import { useEffect, useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PIN_MAX } from '#shared/contracts/cards.js';
import type { AnswerWord } from '#shared/contracts/reviews.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { VoiceKey } from '#src/ui/voice-key.js';
import { useClip } from '../model/use-clip.js';

export type Proof = { pin: string } | { clip: Blob };

/** The helped elder's own yes to what their helper writes: their voice, or their PIN. */
export function ProofPanel({
  name,
  answer,
  busy,
  problem,
  onProof,
  onClose,
}: {
  name: string;
  answer: AnswerWord;
  busy: boolean;
  problem: string | undefined;
  onProof: (proof: Proof) => void;
  onClose: () => void;
}) {
  const { t } = useTranslation(['reviews', 'common']);
  const clip = useClip();
  const [pin, setPin] = useState('');
  const source = useSource(clip.content);
  return (
    <section className="grid gap-4" aria-labelledby="proof-title">
      <h2 id="proof-title">{t('prove.title', { name, answer: t(`answer.${answer}`) })}</h2>
      {clip.isClosed && (
        <Care role="alert">
          <p>{t('prove.noMicrophone')}</p>
        </Care>
      )}
      {source === null ? (
        <>
          <p>
            {t(answer === 'agree' ? 'prove.sayAgree' : 'prove.say', { name, answer: t(`answer.${answer}`) })}
          </p>
          <Button
            look="main"
            full
            icon={
              clip.isOn ? <Square aria-hidden size={24} fill="currentColor" /> : <Mic aria-hidden size={26} />
            }
            onClick={() => {
              if (clip.isOn) clip.stop();
              else void clip.start();
            }}
          >
            {clip.isOn ? t('prove.stop') : t('prove.record')}
          </Button>
        </>
      ) : (
        <>
          <VoiceKey label={t('prove.listen')} source={source} />
          <Button
            look="main"
            full
            busy={busy}
            onClick={() => {
              if (clip.content !== null) onProof({ clip: clip.content });
            }}
          >
            {t('prove.keep')}
          </Button>
          <Button look="quiet" onClick={clip.forget}>
            {t('prove.again')}
          </Button>
        </>
      )}
      <form
        className="grid gap-3"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          if (pin !== '') onProof({ pin });
          setPin('');
        }}
      >
        <TextField
          label={t('prove.pin', { name })}
          type="password"
          inputMode="numeric"
          autoComplete="off"
          maxLength={PIN_MAX}
          value={pin}
          problem={problem}
          onChange={(event) => {
            setPin(event.currentTarget.value.replace(/\D/gu, ''));
          }}
        />
        <Button type="submit" full busy={busy}>
          {t('prove.byPin')}
        </Button>
      </form>
      <Button look="quiet" onClick={onClose}>
        {t('common:cancel')}
      </Button>
    </section>
  );
}

function useSource(content: Blob | null): string | null {
  const source = useMemo(() => (content === null ? null : URL.createObjectURL(content)), [content]);
  useEffect(
    () => () => {
      if (source !== null) URL.revokeObjectURL(source);
    },
    [source],
  );
  return source;
}
