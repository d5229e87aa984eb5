import { useTranslation } from 'react-i18next';
import type { SignOffGap, Version } from '#shared/contracts/versions.js';
import { listWords } from '#src/lib/list-words.js';
import { StateIcon, type StateIconKey } from '#src/ui/icons/state-icon.js';
import { Board } from '#src/ui/surfaces.js';

const ICONS: Record<SignOffGap['code'], StateIconKey> = {
  'needs-elders': 'waiting',
  'needs-person': 'waiting',
  'needs-one-of': 'waiting',
  'needs-steward': 'waiting',
  'entry-without-agree': 'waiting',
  'change-stands': 'changes-asked',
  'not-for-board-stands': 'not-for-the-board',
};

/** What still stands between a submission and "signed off", one sentence each. */
export function MissingBoard({ version }: { version: Version }) {
  const { t, i18n } = useTranslation('versions');
  const { gaps } = version;
  return (
    <Board title={t('missing.title')}>
      {gaps.length === 0 ? (
        <p className="flex items-center gap-3">
          <StateIcon state="agreed" size={26} />
          {t('missing.nothing')}
        </p>
      ) : (
        <>
          <ul className="grid gap-2">
            {gaps.map(({ code, names, count }) => (
              <li key={code} className="flex gap-3">
                <StateIcon state={ICONS[code]} size={26} />
                <span>{t(`missing.${code}`, { count, names: listWords(names, i18n.language) })}</span>
              </li>
            ))}
          </ul>
          <p className="mt-2 text-small text-umber-soft">{t('missing.silence')}</p>
        </>
      )}
    </Board>
  );
}
