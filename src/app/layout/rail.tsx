import { UserRound } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, useLocation } from 'react-router-dom';
import { useCommunityChoice } from '#src/lib/community.js';
import { listWords } from '#src/lib/list-words.js';
import { paths } from '#src/lib/paths.js';
import { useSession } from '#src/lib/session.js';
import { IconLink } from '#src/ui/button.js';
import { RailIcon } from '#src/ui/icons/rail-icon.js';
import { placeOfPath, RAIL_PLACES } from './rail-places.js';

/** The line with its holes; the peg stands where you are. At the foot on a phone, on top from 1024 px. */
export function Rail() {
  const { t, i18n } = useTranslation('common');
  const { pathname } = useLocation();
  const { person } = useSession();
  const { community } = useCommunityChoice();
  const roles = (community?.roles ?? []).map((role) => t(`role.${role}`));
  const here = placeOfPath(pathname);
  return (
    <nav className="rail" aria-label={t('rail.label')}>
      <Link className="rail-brand" to={paths.today()}>
        <RailIcon place="mark" size={32} />
        {t('productName')}
      </Link>
      <ul>
        {RAIL_PLACES.map(({ place, to }) => (
          <li key={place}>
            <Link className="rail-link" to={to} aria-current={place === here ? 'page' : undefined}>
              <RailIcon place={place} />
              {t(`rail.${place}`)}
            </Link>
          </li>
        ))}
      </ul>
      <div className="rail-end">
        <span className="rail-who">
          {community?.communityName}
          <span className="block text-umber-soft">
            {t('rail.who', { name: person?.displayName ?? '', roles: listWords(roles, i18n.language) })}
          </span>
        </span>
        <IconLink to={paths.account()} label={t('rail.account')} icon={<UserRound aria-hidden size={24} />} />
      </div>
    </nav>
  );
}
