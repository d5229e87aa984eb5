import { PenLine } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { KeptLine } from '#src/lib/kept-line.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { AnswerIcon } from '#src/ui/icons/answer-icon.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSign } from '../api/reviews-api.js';

/** Behind the last entry: what was answered, what is open, and the signature. */
export function ReviewEnd({
  version,
  given,
  speaksForSelf,
  firstOpen,
  onOpen,
}: {
  version: Version;
  given: ReadonlyMap<string, Answer>;
  speaksForSelf: boolean;
  firstOpen: number | null;
  onOpen: (index: number) => void;
}) {
  const { t } = useTranslation('reviews');
  const open = version.entries.filter((entry) => !given.has(entry.entryId)).length;
  return (
    <div className="review-entry">
      <h1 id="entry-title" tabIndex={-1}>
        {t('end.title')}
      </h1>
      <p>{open === 0 ? t('end.allAnswered') : t('end.open', { count: open })}</p>
      {firstOpen !== null && (
        <div>
          <Button
            onClick={() => {
              onOpen(firstOpen);
            }}
          >
            {t('end.toOpen')}
          </Button>
        </div>
      )}
      {speaksForSelf && <SignPart version={version} />}
      <KeptLine keptCount={version.keptCount} withdrawnCount={version.withdrawnCount} />
      <h2 className="review-part">{t('end.list')}</h2>
      <ol>
        {version.entries.map(({ entryId, content }, index) => {
          const answer = given.get(entryId);
          return (
            <li key={entryId} className="border-t border-hairline py-2">
              <button
                type="button"
                className="flex min-h-12 w-full items-center gap-3 text-start"
                onClick={() => {
                  onOpen(index);
                }}
              >
                {answer ? <AnswerIcon answer={answer.answer} size={32} /> : <span className="size-8" />}
                <span>
                  <span className="block">{content.titleOfficer}</span>
                  <span className="block text-umber-soft text-small">
                    {answer ? t(`answer.${answer.answer}`) : t('end.none')}
                  </span>
                </span>
              </button>
            </li>
          );
        })}
      </ol>
    </div>
  );
}

function SignPart({ version }: { version: Version }) {
  const { t } = useTranslation('reviews');
  const say = useToast();
  const words = useProblemWords();
  const sign = useSign({ calendarId: version.calendarId, number: version.number });
  // The button is gone once the signature counts; what follows is said all the same.
  const signNow = async () => {
    try {
      const { state } = await sign.mutateAsync('elder');
      say(state === 'signed-off' ? t('end.signedOff') : t('end.signed'));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  const { signAsElder, signClosedBy } = version.may;
  if (!signAsElder && signClosedBy !== null) {
    return (
      <Care>
        <p>{t(`end.closed.${signClosedBy}`)}</p>
      </Care>
    );
  }
  if (!signAsElder) return null;
  return (
    <div className="grid gap-2">
      <p>{t('end.signHint')}</p>
      <Button
        look="main"
        full
        busy={sign.isPending}
        icon={<PenLine aria-hidden size={24} />}
        onClick={() => {
          void signNow();
        }}
      >
        {t('end.sign')}
      </Button>
    </div>
  );
}
