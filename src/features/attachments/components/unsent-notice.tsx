import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { clockOf, secondsOf } from '../model/length-words.js';
import type { Unsent } from '../model/use-kept-recordings.js';

/** A recording was on its way when the page was closed: it is still here. */
export function UnsentNotice({ unsent, onOpen }: { unsent: Unsent; onOpen: () => void }) {
  const { t } = useTranslation('attachments');
  const { moment } = useDateWords();
  const { recording, parts } = unsent;
  const length = secondsOf(parts);
  const facts = { speaker: recording.speaker, moment: moment(recording.beganAt), length: clockOf(length) };
  return (
    <Care>
      <p>
        <strong>{t('unsent.title')}</strong>
      </p>
      <p>
        {parts.some(({ part }) => part > 0) ? t('unsent.sentence', facts) : t('unsent.onlyConsent', facts)}
      </p>
      <Button className="mt-2" onClick={onOpen}>
        {t('unsent.open')}
      </Button>
    </Care>
  );
}
