import { useTranslation } from 'react-i18next';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useProblemWords, type ProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import type { Sending } from '../model/use-sending.js';

/** How far a sending is, with a way to stop it; afterwards what stood in its way. */
export function SendingLine<T>({
  sending,
  stoppedWords,
}: {
  sending: Sending<T>;
  /** What is true after the person stopped it. */
  stoppedWords: string;
}) {
  const { t } = useTranslation('attachments');
  const words = useProblemWords();
  const { share, trouble, wasStopped, stop } = sending;
  if (share !== null) {
    const percent = Math.floor(share * 100);
    return (
      <div className="long-work">
        <progress className="sent" value={percent} max={100} aria-label={t('sending.title')} />
        <Button onClick={stop}>{t('sending.stop')}</Button>
        <span className="text-small text-umber-soft">
          {percent < 100 ? t('sending.percent', { percent }) : t('picture.drawing')}
        </span>
      </div>
    );
  }
  if (trouble === null && !wasStopped) return null;
  return (
    <Care role="alert">
      <p>{wasStopped ? stoppedWords : sentenceOf(trouble, words)}</p>
      {!wasStopped && <p>{stoppedWords}</p>}
    </Care>
  );
}

/** What stands at a field says more than "some fields": here it is nearly always the file. */
function sentenceOf(trouble: unknown, words: ProblemWords): string {
  const first = trouble instanceof ApiProblem ? trouble.errors[0] : undefined;
  return first === undefined ? words.problem(trouble) : words.field(first.code, first.message);
}
