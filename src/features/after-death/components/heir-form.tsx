import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { CommunityPerson } from '#shared/contracts/people.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { useToast } from '#src/ui/toast.js';
import { useNameHeir, type Whom } from '../api/after-death-api.js';

export type Villager = Pick<CommunityPerson, 'id' | 'displayName'>;

/** Somebody left something to a name that fits nobody: the steward says who is meant. */
export function HeirForm({ whom, name, others }: { whom: Whom; name: string; others: readonly Villager[] }) {
  const { t } = useTranslation('people');
  const words = useProblemWords();
  const say = useToast();
  const nameHeir = useNameHeir(whom);
  const [personId, setPersonId] = useState('');
  const [problem, setProblem] = useState<string | undefined>(undefined);
  const pass = async () => {
    if (personId === '') {
      setProblem(t('death.heirNone'));
      return;
    }
    try {
      await nameHeir.mutateAsync({ name, personId });
      say(t('death.passed'));
    } catch (cause) {
      setProblem(words.problem(cause));
    }
  };
  return (
    <div className="grid gap-3 border-t border-hairline pt-3">
      <SelectField
        label={t('death.heir', { name })}
        hint={t('death.heirHint')}
        value={personId}
        problem={problem}
        onChange={(event) => {
          setPersonId(event.currentTarget.value);
          setProblem(undefined);
        }}
      >
        <option value="">–</option>
        {others.map(({ id, displayName }) => (
          <option key={id} value={id}>
            {displayName}
          </option>
        ))}
      </SelectField>
      <Button busy={nameHeir.isPending} onClick={() => void pass()}>
        {t('death.pass')}
      </Button>
    </div>
  );
}
