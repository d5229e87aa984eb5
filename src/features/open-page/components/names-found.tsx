import { useTranslation } from 'react-i18next';
import type { LeftOutOfOpenPage } from '#shared/contracts/open-page.js';
import { SureButton } from '#src/lib/sure-button.js';
import { useSayNoName } from '../api/open-page-api.js';

interface NamesFoundProps {
  communityId: string;
  leftOut: readonly LeftOutOfOpenPage[];
}

/** Entries whose words hold what may be somebody's name: rewritten in the draft, or said to be none. */
export function NamesFound({ communityId, leftOut }: NamesFoundProps) {
  const { t } = useTranslation('open');
  const named = leftOut.filter(({ found }) => found.length > 0);
  if (named.length === 0) return null;
  return (
    <div className="border-t border-hairline pt-3">
      <p>{t('board.leftOut.names')}</p>
      <p className="text-small">{t('board.leftOut.rewrite')}</p>
      <ul className="mt-2 grid gap-3">
        {named.map(({ entryId, title, found }) => (
          <li key={entryId}>
            <p>
              <strong>{title}</strong>
            </p>
            {found.map((words) => (
              <Found key={words.word} communityId={communityId} entryId={entryId} {...words} />
            ))}
          </li>
        ))}
      </ul>
    </div>
  );
}

type FoundProps = LeftOutOfOpenPage['found'][number] & { communityId: string; entryId: string };

function Found({ communityId, entryId, word, text, names }: FoundProps) {
  const { t } = useTranslation('open');
  const say = useSayNoName(communityId);
  return (
    <>
      <p>{t('board.leftOut.words', { word: t(`board.leftOut.word.${word}`), text })}</p>
      <ul className="grid gap-1">
        {names.map(({ name, key }) => (
          <li key={key} className="flex flex-wrap items-center gap-x-4">
            <span>{t('board.leftOut.takenFor', { name })}</span>
            <SureButton
              look="quiet"
              label={t('board.noName.say')}
              question={t('board.noName.sure', { name })}
              what={t('board.noName.what', { text })}
              yes={t('board.noName.do')}
              act={() => say.mutateAsync({ entryId, word, key })}
            />
          </li>
        ))}
      </ul>
    </>
  );
}
