import { useTranslation } from 'react-i18next';
import type { Version } from '#shared/contracts/versions.js';
import { useDateWords } from '#src/lib/date-words.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { Board } from '#src/ui/surfaces.js';

export function SignaturesBoard({ version }: { version: Version }) {
  const { t } = useTranslation('versions');
  const dates = useDateWords();
  return (
    <Board title={t('signatures.title')}>
      {version.signatures.length === 0 ? (
        <p>{t('signatures.none')}</p>
      ) : (
        <ul className="grid gap-2">
          {version.signatures.map(({ personId, displayName, role, signedAt }) => (
            <li key={`${personId} ${role}`} className="flex gap-3">
              <StateIcon state="agreed" size={26} />
              <span>
                {t('signatures.line', {
                  name: displayName,
                  role: t(`signatures.role.${role}`),
                  when: dates.moment(signedAt),
                })}
              </span>
            </li>
          ))}
        </ul>
      )}
    </Board>
  );
}
