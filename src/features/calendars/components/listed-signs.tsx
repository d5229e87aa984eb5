import { useQuery } from '@tanstack/react-query';
import { ListPlus } from 'lucide-react';
import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import type { RecordSign } from '#shared/contracts/event-record.js';
import { signInput } from '#shared/contracts/signs.js';
import { useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { signsQuery } from '#src/lib/sign-queries.js';
import { useNewSign } from '#src/lib/use-new-sign.js';
import { Button } from '#src/ui/button.js';
import { Chip } from '#src/ui/chip.js';
import { FieldNotes, SelectField } from '#src/ui/field.js';
import { useToast } from '#src/ui/toast.js';
import type { EntryDraft } from '../model/entry-draft.js';
import { setRecord, type RecordProps } from './record-parts.js';

/** Signs of the village's list for which this entry does not wait yet. */
export function SignsToChoose({ form }: RecordProps) {
  const { t } = useTranslation('signs');
  const { communityId } = useCurrentCommunity();
  const { data: known } = useQuery(signsQuery(communityId));
  const { list } = form.draft.record.signs;
  const left = (known ?? []).filter(({ id }) => list.every(({ sharedId }) => sharedId !== id));
  if (left.length === 0) return null;
  return (
    <SelectField
      label={t('entry.choose')}
      value=""
      onChange={(event) => {
        const sign = left.find(({ id }) => id === event.currentTarget.value);
        if (!sign) return;
        const { id: sharedId, type, name, look, where, usual, stillSeen } = sign;
        setRecord(form, 'signs', {
          list: [...list, { type, name, look, where, usual, stillSeen, sharedId }],
        });
      }}
    >
      <option value="">{t('entry.chooseNone')}</option>
      {left.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </SelectField>
  );
}

/** What the list says of a sign; it is changed there. */
export function SignFromList({ sign, problem }: { sign: RecordSign; problem: string | undefined }) {
  const { t } = useTranslation(['signs', 'record']);
  const fieldId = useId();
  return (
    <div>
      <p>
        <strong>{sign.name}</strong> <Chip>{t('entry.fromList')}</Chip>
      </p>
      <p className="text-small text-umber-soft">
        {[t(`record:signs.type.${sign.type}`), sign.look, sign.where].filter((one) => one !== '').join(' · ')}
      </p>
      <FieldNotes inputId={fieldId} problem={problem} />
    </div>
  );
}

interface SignToListProps {
  draft: EntryDraft;
  sign: RecordSign;
  onListed: (patch: Pick<RecordSign, 'sharedId'>) => void;
}

/** Makes an entry's own sign one of the village's, which people can mark as seen. */
export function SignToList({ draft, sign, onListed }: SignToListProps) {
  const { t } = useTranslation('signs');
  const { communityId } = useCurrentCommunity();
  const mayWrite = useRoles().is('officer', 'elder');
  const words = useProblemWords();
  const say = useToast();
  const add = useNewSign(communityId);
  if (!mayWrite || sign.name.trim() === '') return null;
  const { sharedId: _listed, ownId: _own, ...said } = sign;
  // No more people see the sign than the entry whose words it was.
  const { sharingLevel, sharing } = draft;
  const list = async () => {
    const parsed = signInput.safeParse({ ...said, sharingLevel, sharing });
    if (!parsed.success) return;
    try {
      const { id, name } = await add.mutateAsync(parsed.data);
      onListed({ sharedId: id });
      say(t('entry.onList', { name }));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  return (
    <div>
      <Button
        look="quiet"
        icon={<ListPlus aria-hidden size={22} />}
        busy={add.isPending}
        onClick={() => void list()}
      >
        {t('entry.toList')}
      </Button>
      <p className="field-hint">{t('entry.toListHint')}</p>
    </div>
  );
}
