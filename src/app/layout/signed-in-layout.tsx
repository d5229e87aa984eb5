import { UserRound } from 'lucide-react';
import { lazy, Suspense } from 'react';
import { useTranslation } from 'react-i18next';
import { Navigate, Outlet, useLocation, useMatches } from 'react-router-dom';
import { CurrentCommunityProvider, useCommunityChoice } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { PATTERNS, paths } from '#src/lib/paths.js';
import { useSession } from '#src/lib/session.js';
import { IconLink } from '#src/ui/button.js';
import { Mast, MastEnd, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState } from '#src/ui/waiting.js';
import type { RouteHandle } from '../router.js';
import { Frame } from './frame.js';
import { Rail } from './rail.js';
import { useForgetWithdrawn } from './use-forget-withdrawn.js';

/** Only whoever came in by a card fetches it. */
const CardBar = lazy(async () => ({ default: (await import('./card-bar.js')).CardBar }));

/** Only whoever helps somebody fetches it. */
const HelpingBar = lazy(async () => ({
  default: (await import('#src/features/helping/components/helping-bar.js')).HelpingBar,
}));

/** Asks a visitor to sign in first; brings everybody else to their screen, inside the rail. */
export function SignedInLayout() {
  const { person, card, helping } = useSession();
  const location = useLocation();
  const matches = useMatches();
  const { t } = useTranslation('common');
  useForgetWithdrawn();
  if (person === null) {
    // From the account page people sign out: nothing calls them back there.
    const next = location.pathname === PATTERNS.account ? undefined : location.pathname + location.search;
    return <Navigate to={paths.signIn(next)} replace />;
  }
  const isAccount = location.pathname === PATTERNS.account;
  const hasRail = matches.every(({ handle }) => (handle as RouteHandle | undefined)?.rail !== false);
  return (
    <CurrentCommunityProvider>
      <MastEnd
        value={
          isAccount ? null : (
            <span className="phone-only">
              <IconLink
                to={paths.account()}
                label={t('rail.account')}
                icon={<UserRound aria-hidden size={24} />}
              />
            </span>
          )
        }
      >
        <Frame rail={hasRail ? <Rail /> : null}>
          {card !== null && (
            <Suspense fallback={null}>
              <CardBar />
            </Suspense>
          )}
          {helping !== undefined && (
            <Suspense fallback={null}>
              <HelpingBar />
            </Suspense>
          )}
          <Outlet />
        </Frame>
      </MastEnd>
    </CurrentCommunityProvider>
  );
}

/** Everything of a village needs one. */
export function NeedsVillage() {
  const { community } = useCommunityChoice();
  return community === null ? <NoVillagePage /> : <Outlet key={community.communityId} />;
}

function NoVillagePage() {
  const { t } = useTranslation('common');
  usePageTitle(t('village.none'));
  return (
    <Page>
      <Mast title={t('productName')} />
      <Board>
        <EmptyState title={t('village.none')}>{t('village.noneHint')}</EmptyState>
      </Board>
    </Page>
  );
}
