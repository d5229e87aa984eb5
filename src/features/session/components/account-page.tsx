import { LogOut } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useCommunityChoice } from '#src/lib/community.js';
import { listWords } from '#src/lib/list-words.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { THEMES, useTheme } from '#src/lib/theme.js';
import { Button } from '#src/ui/button.js';
import { Columns, Mast, Page } from '#src/ui/page.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { TroubleNote } from '#src/ui/waiting.js';
import { useSignOut } from '../api/session-mutations.js';
import { ChangePasswordForm } from './change-password-form.js';
import { DevicesBoard } from './devices-board.js';

interface AccountPageProps {
  /** Begin to type for somebody else. */
  helping?: ReactNode;
  letters?: ReactNode;
  /** What the person may bring back. */
  hidden?: ReactNode;
  /** What is kept about them, and the way out. */
  ownData?: ReactNode;
}

/** The person and their device: village on screen, look, password, sign out. */
export function AccountPage({ helping, letters, hidden, ownData }: AccountPageProps) {
  const { t } = useTranslation(['session', 'common']);
  const { person, card } = useSession();
  const words = useProblemWords();
  const signOut = useSignOut();
  usePageTitle(t('account.title'));
  return (
    <Page>
      <Mast title={t('account.title')} under={t('account.signedInAs', { name: person?.displayName ?? '' })} />
      <Columns>
        <div className="grid gap-4">
          <VillageBoard />
          {helping}
          {hidden}
          {letters}
          <Board title={t('account.screen')}>
            <ThemePick />
          </Board>
          {ownData}
        </div>
        <div className="grid gap-4">
          {card === null && (
            <>
              <Board title={t('account.changePassword')}>
                <ChangePasswordForm />
              </Board>
              <DevicesBoard />
            </>
          )}
          {signOut.error !== null && <TroubleNote sentence={words.problem(signOut.error)} />}
          <div>
            <Button
              busy={signOut.isPending}
              icon={<LogOut aria-hidden className="turns" size={20} />}
              onClick={() => {
                signOut.mutate();
              }}
            >
              {t('account.signOut')}
            </Button>
          </div>
        </div>
      </Columns>
    </Page>
  );
}

/** Which village is on screen; each with what the person is there. */
function VillageBoard() {
  const { t, i18n } = useTranslation(['session', 'common']);
  const { community, memberships, choose } = useCommunityChoice();
  const say = useToast();
  if (community === null) {
    return (
      <Board title={t('account.yourVillages')}>
        <p>{t('common:village.none')}</p>
        <p className="mt-2 text-umber-soft">{t('common:village.noneHint')}</p>
      </Board>
    );
  }
  return (
    <Board title={t('account.yourVillages')}>
      <PickGroup
        label={t('common:village.choose')}
        labelForEars
        stacked
        value={community.communityId}
        onChange={(communityId) => {
          choose(communityId);
          const village = memberships.find((each) => each.communityId === communityId)?.communityName ?? '';
          say(t('switched', { village }));
        }}
        options={memberships.map(({ communityId, communityName, roles }) => ({
          value: communityId,
          label: communityName,
          note: listWords(
            roles.map((role) => t(`common:role.${role}`)),
            i18n.language,
          ),
        }))}
      />
    </Board>
  );
}

function ThemePick() {
  const { t } = useTranslation('common');
  const [theme, chooseTheme] = useTheme();
  return (
    <PickGroup
      label={t('theme.label')}
      stacked
      value={theme}
      onChange={chooseTheme}
      options={THEMES.map((value) => ({ value, label: t(`theme.${value}`), note: t(`theme.${value}Note`) }))}
    />
  );
}
