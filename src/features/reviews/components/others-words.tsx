import { useTranslation } from 'react-i18next';
import type { Answer, AnswerWord } from '#shared/contracts/reviews.js';
import { Well } from '#src/ui/surfaces.js';
import { ProofLine, SpokenLine } from './answer-voice.js';

const SENTENCES = {
  agree: ['otherAgree', 'otherAgreeNote'],
  'change-this': ['otherChange', 'otherChangeNote'],
  'not-for-the-board': ['otherNot', 'otherNotNote'],
  'not-mine-to-say': ['otherMine', 'otherMineNote'],
} as const satisfies Record<AnswerWord, readonly [string, string]>;

/** What other elders said to this entry: kept differences first, each under its elder's name. No counting, no mean. */
export function OthersWords({ answers }: { answers: readonly Answer[] }) {
  const { t } = useTranslation('reviews');
  const kept = answers.filter((answer) => answer.letStand);
  const others = answers.filter((answer) => !answer.letStand);
  return (
    <>
      {kept.length > 0 && (
        <Well>
          <h2 className="review-part">{t('kept')}</h2>
          {kept.map((answer) => (
            <div key={answer.id}>
              <p>
                {answer.note === ''
                  ? t('keptByVoice', { name: answer.elderName })
                  : t('keptBy', { name: answer.elderName, note: answer.note })}
              </p>
              <SpokenLine answer={answer} />
            </div>
          ))}
        </Well>
      )}
      {others.length > 0 && (
        <section>
          <h2 className="review-part">{t('others')}</h2>
          <ul className="grid gap-2">
            {others.map((answer) => (
              <li key={answer.id}>
                <AnswerSentence answer={answer} />
              </li>
            ))}
          </ul>
        </section>
      )}
    </>
  );
}

export function AnswerSentence({ answer }: { answer: Answer }) {
  const { t } = useTranslation('reviews');
  const [plain, withNote] = SENTENCES[answer.answer];
  return (
    <>
      {t(answer.note === '' ? plain : withNote, { name: answer.elderName, note: answer.note })}
      <SpokenLine answer={answer} />
      <ProofLine answer={answer} />
    </>
  );
}
