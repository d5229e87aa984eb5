import { KeyRound, Mail, Pencil, UserMinus } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { CommunityPerson } from '#shared/contracts/people.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useSession } from '#src/lib/session.js';
import { Button, IconButton } from '#src/ui/button.js';
import { Chip } from '#src/ui/chip.js';

export interface PersonActions {
  onEdit: (person: CommunityPerson) => void;
  onRemove: (person: CommunityPerson) => void;
  onRenewCode: (person: CommunityPerson) => void;
  onInvite: (person: CommunityPerson) => void;
  /** What is seldom done, beside the others. */
  quietly?: ((person: CommunityPerson) => ReactNode) | undefined;
}

/** Everybody of the village; with actions for the steward, without them for everybody else. */
export function PeopleList({
  people,
  actions,
}: {
  people: readonly CommunityPerson[];
  actions: PersonActions | null;
}) {
  return (
    <ul className="rows">
      {people.map((person) => (
        <PersonRow key={person.id} person={person} actions={actions} />
      ))}
    </ul>
  );
}

function PersonRow({ person, actions }: { person: CommunityPerson; actions: PersonActions | null }) {
  const { t } = useTranslation(['people', 'common']);
  const you = useSession().person?.id === person.id;
  const { displayName: name } = person;
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-2 border-t border-hairline py-3 first:border-t-0">
      <div className="min-w-0 flex-1 basis-56">
        <p>
          <strong>{name}</strong>
          {you && <span className="text-umber-soft"> · {t('list.you')}</span>}
        </p>
        {person.email !== '' && <p className="text-umber-soft break-words">{person.email}</p>}
        {person.email === '' && actions !== null && <p className="text-umber-soft">{t('list.byCard')}</p>}
        <p className="mt-1 flex flex-wrap gap-2">
          {person.roles.map((role) => (
            <Chip key={role}>{t(`common:role.${role}`)}</Chip>
          ))}
        </p>
        {!person.active && <CodeLine person={person} actions={actions} />}
      </div>
      {actions !== null && (
        <div className="flex gap-2">
          <IconButton
            label={t('roles.edit', { name })}
            icon={<Pencil aria-hidden size={22} />}
            onClick={() => {
              actions.onEdit(person);
            }}
          />
          {!you && (
            <IconButton
              label={t('remove.action', { name })}
              icon={<UserMinus aria-hidden size={22} />}
              onClick={() => {
                actions.onRemove(person);
              }}
            />
          )}
          {!you && actions.quietly?.(person)}
        </div>
      )}
    </li>
  );
}

function CodeLine({ person, actions }: { person: CommunityPerson; actions: PersonActions | null }) {
  const { t } = useTranslation('people');
  const words = useDateWords();
  return (
    <div className="mt-2">
      <p>
        {t('list.notYet')}.{' '}
        {actions !== null &&
          (person.codeExpiresAt === null
            ? t('list.codeOver')
            : t('list.codeUntil', { day: words.day(person.codeExpiresAt.slice(0, 10)) }))}
      </p>
      {actions !== null && (
        <Button
          look="quiet"
          icon={<KeyRound aria-hidden size={20} />}
          onClick={() => {
            actions.onRenewCode(person);
          }}
        >
          {t('code.renew')}
        </Button>
      )}
      {actions !== null && (
        <Button
          look="quiet"
          icon={<Mail aria-hidden size={20} />}
          onClick={() => {
            actions.onInvite(person);
          }}
        >
          {t('code.sendLetter')}
        </Button>
      )}
    </div>
  );
}
