import { EyeOff } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useLocation } from 'react-router-dom';
import type { SharedItemType } from '#shared/contracts/sharing.js';
import { ButtonLink } from '#src/ui/button.js';
import { paths } from './paths.js';

interface TakeBackLinkProps {
  communityId: string;
  itemType: SharedItemType;
  itemId: string;
  /** What it leads to, for ears: several of them stand on one page. */
  about?: string | undefined;
}

/** The way to hide a thing or take it back. It stands beside everything that people gave. */
export function TakeBackLink({ communityId, itemType, itemId, about }: TakeBackLinkProps) {
  const { t } = useTranslation('common');
  const { pathname, search } = useLocation();
  return (
    <ButtonLink
      look="quiet"
      to={paths.takeBack(communityId, itemType, itemId)}
      state={{ from: pathname + search }}
      icon={<EyeOff aria-hidden size={20} />}
      aria-label={about === undefined ? undefined : t('takeBackAbout', { about })}
    >
      {t('takeBack')}
    </ButtonLink>
  );
}
