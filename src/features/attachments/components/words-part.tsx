import { PenLine } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Attachment, AttachmentWords } from '#shared/contracts/attachments.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useWriterWords } from '#src/lib/giver-words.js';
import { Button } from '#src/ui/button.js';
import { Well } from '#src/ui/surfaces.js';
import { useLanguageNames } from '../model/use-language-names.js';
import { WordsForm } from './words-form.js';

/** What was said, written out and translated, beneath the sound. */
export function WordsPart({ attachment }: { attachment: Attachment }) {
  const { t } = useTranslation('attachments');
  const [edited, setEdited] = useState<AttachmentWords | 'new' | null>(null);
  const { words, may } = attachment;
  const hasWords = words.some(({ kind }) => kind === 'words');
  return (
    <section className="grid gap-3" aria-label={t('words.title')}>
      {words.length === 0 && <p className="text-umber-soft">{t('words.none')}</p>}
      {words.map((each) => (
        <Written
          key={`${each.kind} ${each.language}`}
          words={each}
          communityId={attachment.communityId}
          onChange={
            may.writeWords
              ? () => {
                  setEdited(each);
                }
              : null
          }
        />
      ))}
      {edited !== null && (
        <WordsForm
          key={edited === 'new' ? 'new' : `${edited.kind} ${edited.language}`}
          attachment={attachment}
          before={edited === 'new' ? null : edited}
          onDone={() => {
            setEdited(null);
          }}
        />
      )}
      {may.writeWords && edited === null && (
        <div>
          <Button
            look="quiet"
            icon={<PenLine aria-hidden size={20} />}
            onClick={() => {
              setEdited('new');
            }}
          >
            {hasWords ? t('words.translate') : t('words.write')}
          </Button>
        </div>
      )}
    </section>
  );
}

function Written({
  words,
  communityId,
  onChange,
}: {
  words: AttachmentWords;
  communityId: string;
  onChange: (() => void) | null;
}) {
  const { t } = useTranslation('attachments');
  const { moment } = useDateWords();
  const writer = useWriterWords();
  const { nameOf } = useLanguageNames(communityId);
  const { kind, language, text, authorName, updatedAt, checkedBySpeaker } = words;
  return (
    <Well>
      <p className="text-small text-umber-soft">{t(`words.${kind}In`, { language: nameOf(language) })}</p>
      <p className="own-words whitespace-pre-line" lang={language}>
        {text}
      </p>
      <p className="mt-2 text-small text-umber-soft">
        {t('words.author', { name: writer(authorName), moment: moment(updatedAt) })}{' '}
        {checkedBySpeaker ? t('words.checked') : t('words.unchecked')}
      </p>
      {onChange !== null && (
        <Button look="quiet" onClick={onChange}>
          {t('words.change')}
        </Button>
      )}
    </Well>
  );
}
