import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  communityPerson,
  roles as rolesSchema,
  type CommunityPerson,
  type Role,
} from '#shared/contracts/people.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { listWords } from '#src/lib/list-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { TextField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSetRoles } from '../api/people-mutations.js';
import { RoleTicks } from './role-ticks.js';

/** Sets the roles of one person. A change that somebody else made meanwhile is told, never overwritten unseen. */
export function RolesDialog({
  communityId,
  person,
  onClose,
}: {
  communityId: string;
  person: CommunityPerson;
  onClose: () => void;
}) {
  const { t, i18n } = useTranslation(['people', 'common']);
  const words = useProblemWords();
  const say = useToast();
  const set = useSetRoles(communityId);
  const [chosen, setChosen] = useState<Role[]>(person.roles);
  const [email, setEmail] = useState('');
  const [emailProblem, setEmailProblem] = useState<string | undefined>();
  const [version, setVersion] = useState(person.version);
  const [said, setSaid] = useState<string | null>(null);
  const bad = rolesSchema.safeParse(chosen).error?.issues[0]?.message;

  const save = async () => {
    if (bad !== undefined) return;
    try {
      setEmailProblem(undefined);
      const address = email === '' ? {} : { email };
      await set.mutateAsync({ personId: person.id, roles: chosen, ...address, version });
      say(t('roles.saved', { name: person.displayName }));
      onClose();
    } catch (cause) {
      const refused = cause instanceof ApiProblem && cause.errors.find(({ field }) => field === 'email');
      if (refused) {
        setEmailProblem(words.field(refused.code, refused.message));
        return;
      }
      const newer =
        cause instanceof ApiProblem && cause.slug === 'stale'
          ? communityPerson.safeParse(cause.current)
          : null;
      if (newer?.success) {
        setVersion(newer.data.version);
        const names = newer.data.roles.map((role) => t(`common:role.${role}`));
        setSaid(t('roles.stale', { roles: listWords(names, i18n.language) }));
      } else setSaid(words.problem(cause));
    }
  };
  return (
    <Dialog
      title={t('roles.title', { name: person.displayName })}
      isOpen
      onClose={onClose}
      closesBeside={false}
    >
      <div className="grid gap-4">
        {said !== null && (
          <Care role="alert">
            <p>{said}</p>
          </Care>
        )}
        <RoleTicks
          label={t('add.roles')}
          value={chosen}
          onChange={setChosen}
          problem={bad === undefined ? undefined : words.field(bad)}
        />
        {person.email === '' && (
          <TextField
            label={t('roles.address')}
            hint={t('roles.addressHint')}
            problem={emailProblem}
            type="email"
            autoComplete="off"
            value={email}
            onChange={(event) => {
              setEmail(event.currentTarget.value);
            }}
          />
        )}
        <Button
          look="main"
          full
          busy={set.isPending}
          onClick={() => {
            void save();
          }}
        >
          {t('roles.save')}
        </Button>
      </div>
    </Dialog>
  );
}
