import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { ConsentLine } from '#shared/contracts/consents.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useWriterWords } from '#src/lib/giver-words.js';
import { paths } from '#src/lib/paths.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import { ConsentChips } from './consent-chips.js';
import { Withdraw } from './withdraw.js';

/** One consent of the register. Of what the reader may not see it says the kind, the level and the days alone. */
export function RegisterRow({ line }: { line: ConsentLine }) {
  const { t } = useTranslation('consents');
  const dates = useDateWords();
  const writer = useWriterWords();
  const levelOf = useSharingWords();
  const { itemType, itemId, title, giverName, uses, may } = line;
  const item = t(`item.${itemType}`);
  const name = title === null ? t('keptLine', { item }) : t('sheet.about', { item, title });
  return (
    <li className="grid gap-2 border-t border-hairline py-3 first:border-t-0">
      <p>
        {may.read ? <Link to={paths.itemConsents(itemType, itemId)}>{name}</Link> : name}
        <span className="text-umber-soft"> · {levelOf(line.level)}</span>
      </p>
      {giverName !== null && <p className="own-words">{writer(giverName)}</p>}
      <ConsentChips state={line.state} isDue={line.isDue} />
      {uses !== null && uses.length > 0 && (
        <p className="text-small">
          {t('sheet.yesTo')}: {uses.map((use) => t(`use.${use}.short`)).join(' · ')}
        </p>
      )}
      <p className="text-small text-umber-soft">
        {line.until !== null && <>{t('line.until', { day: dates.day(line.until, 'year') })} </>}
        {t('line.reviewBy', { day: dates.day(line.reviewBy, 'year') })}
      </p>
      {may.withdraw && !may.read && <Withdraw line={line} />}
    </li>
  );
}
