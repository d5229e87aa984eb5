import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { signInput, type Sign, type SignInput } from '#shared/contracts/signs.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { SharingFields } from '#src/lib/sharing-fields.js';
import { NEW_SIGN, SignWordFields } from '#src/lib/sign-word-fields.js';
import { useNewSign } from '#src/lib/use-new-sign.js';
import { useWrittenForm } from '#src/lib/written-form.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useSignChanges } from '../api/sign-mutations.js';

interface SignFormProps {
  communityId: string;
  /** Null for a new one. */
  sign: Sign | null;
  onDone: () => void;
}

/** A sign of the village's list, to be written. What somebody else saved meanwhile is said, and nothing typed is lost. */
export function SignForm({ communityId, sign, onDone }: SignFormProps) {
  const { t } = useTranslation('signs');
  const say = useToast();
  const add = useNewSign(communityId);
  const { change } = useSignChanges(communityId);
  const { written, set, at, checked, refuse } = useWrittenForm<SignInput>(signInput, () => inputOf(sign));
  const [version, setVersion] = useState(sign?.version ?? 1);
  const [overall, setOverall] = useState<string | null>(null);
  const save = async () => {
    const input = checked();
    if (input === null) return;
    try {
      if (sign === null) await add.mutateAsync(input);
      else await change.mutateAsync({ signId: sign.id, input: { ...input, version } });
      say(t('form.saved'));
      onDone();
    } catch (cause) {
      const refusal = refuse(cause);
      const current = cause instanceof ApiProblem ? currentOf(cause) : null;
      if (current) setVersion(current.version);
      setOverall(current ? t('form.stale', { name: current.name }) : refusal);
    }
  };
  const { sharingLevel: level, sharing: details = PLAIN_DETAILS } = written;
  return (
    <form
      noValidate
      className="@container grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      {overall !== null && (
        <Care blocked role="alert">
          <p>{overall}</p>
        </Care>
      )}
      {sign !== null && <p className="text-small text-umber-soft">{t('form.drafts')}</p>}
      <SignWordFields sign={written} at={at} set={set} />
      <SharingFields
        label={t('form.level')}
        hint={t('form.levelHint')}
        value={{ level, details }}
        problem={(field) => at(field === 'level' ? 'sharingLevel' : `sharing.${field}`)}
        onChange={(shared) => {
          set({ sharingLevel: shared.level, sharing: shared.details });
        }}
      />
      <Button type="submit" look="main" full busy={add.isPending || change.isPending}>
        {t('form.save')}
      </Button>
    </form>
  );
}

function inputOf(sign: Sign | null): SignInput {
  if (sign === null) return { ...NEW_SIGN, sharingLevel: 'village' };
  const { type, name, look, where, usual, stillSeen, sharingLevel, sharing = PLAIN_DETAILS } = sign;
  return { type, name, look, where, usual, stillSeen, sharingLevel, sharing };
}

/** The state that a colleague saved meanwhile, where that is why it was refused. */
function currentOf({ slug, current }: ApiProblem): Sign | null {
  return slug === 'stale' && current !== undefined && current !== null ? (current as Sign) : null;
}
