import { useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { CommunityPerson } from '#shared/contracts/people.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Columns, Mast, Page } from '#src/ui/page.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { useAddPerson, useRemovePerson, useRenewCode, useSendInvitation } from '../api/people-mutations.js';
import { peopleQuery } from '../api/people-queries.js';
import { AddPersonForm } from './add-person-form.js';
import { CardNextDialog } from './card-next-dialog.js';
import { CodeDialog, type IssuedCode } from './code-dialog.js';
import { PeopleList, type PersonActions } from './people-list.js';
import { RolesDialog } from './roles-dialog.js';
import { VillageTabs } from './village-tabs.js';

/** Who belongs to the village. The steward adds people with a code and sets roles. */
export function PeoplePage({
  quietly,
}: {
  /** What is seldom done to a person, with everybody of the village beside them. */
  quietly?: (person: CommunityPerson, people: readonly CommunityPerson[]) => ReactNode;
}) {
  const { t } = useTranslation('people');
  const { communityId, communityName } = useCurrentCommunity();
  const isSteward = useRoles().is('steward');
  const inner = useRoles().is('steward', 'officer', 'elder');
  const words = useProblemWords();
  const people = useQuery({ ...peopleQuery(communityId), enabled: inner });
  const [issued, setIssued] = useState<IssuedCode | null>(null);
  const [needsCard, setNeedsCard] = useState<string | null>(null);
  const [edited, setEdited] = useState<CommunityPerson | null>(null);
  const actions = usePersonActions(communityId, setIssued, setEdited);
  usePageTitle(t('list.title'));

  const list = (
    <Board title={t('list.count', { count: people.data?.length ?? 0 })}>
      {!inner && <p>{t('list.notForYou')}</p>}
      {inner && people.isPending && <Skeleton lines={6} />}
      {people.error !== null && (
        <TroubleNote sentence={words.problem(people.error)} onRetry={() => void people.refetch()} />
      )}
      {people.data && (
        <PeopleList
          people={people.data}
          actions={isSteward ? { ...actions, quietly: (person) => quietly?.(person, people.data) } : null}
        />
      )}
      {inner && !isSteward && <p className="mt-3 text-umber-soft">{t('list.onlySteward')}</p>}
    </Board>
  );
  return (
    <Page>
      <Mast title={communityName} under={t('list.title')} />
      <VillageTabs />
      {isSteward ? (
        <Columns wider="first" className="mt-4">
          {list}
          <Board title={t('add.title')}>
            <AddPersonForm communityId={communityId} onCode={setIssued} onCard={setNeedsCard} />
          </Board>
        </Columns>
      ) : (
        <div className="mt-4">{list}</div>
      )}
      <CodeDialog
        issued={issued}
        onClose={() => {
          setIssued(null);
        }}
      />
      <CardNextDialog
        name={needsCard}
        onClose={() => {
          setNeedsCard(null);
        }}
      />
      {edited !== null && (
        <RolesDialog
          communityId={communityId}
          person={edited}
          onClose={() => {
            setEdited(null);
          }}
        />
      )}
    </Page>
  );
}

function usePersonActions(
  communityId: string,
  onCode: (issued: IssuedCode) => void,
  onEdit: (person: CommunityPerson) => void,
): PersonActions {
  const { t } = useTranslation('people');
  const say = useToast();
  const words = useProblemWords();
  const renew = useRenewCode(communityId);
  const invite = useSendInvitation(communityId);
  const remove = useRemovePerson(communityId);
  const add = useAddPerson(communityId);
  const tell = (cause: unknown) => {
    say(words.problem(cause));
  };

  const putBack = ({ id, email, displayName, roles }: CommunityPerson) => {
    add.mutate(
      { email, displayName, roles, ...(email === '' ? { personId: id } : {}) },
      {
        onSuccess: ({ oneTimeCode }) => {
          if (oneTimeCode === null) say(t('remove.back', { name: displayName }));
          else onCode({ name: displayName, code: oneTimeCode });
        },
        onError: tell,
      },
    );
  };
  return {
    onEdit,
    onInvite: (person) => {
      invite.mutate(person.id, {
        onSuccess: () => {
          say(t('code.letterSent', { email: person.email }));
        },
        onError: tell,
      });
    },
    onRenewCode: (person) => {
      renew.mutate(person.id, {
        onSuccess: ({ oneTimeCode }) => {
          if (oneTimeCode !== null) onCode({ name: person.displayName, code: oneTimeCode });
        },
        onError: tell,
      });
    },
    onRemove: (person) => {
      remove.mutate(person.id, {
        onSuccess: () => {
          say(t('remove.removed', { name: person.displayName }), {
            onUndo: () => {
              putBack(person);
            },
          });
        },
        onError: tell,
      });
    },
  };
}
