import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { isTighterOrSame } from '#shared/contracts/sharing-tightness.js';
import { itemSharing, sharingInput, type ItemSharing } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useRoles } from '#src/lib/community.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { SharingFields, type SharingValue } from '#src/lib/sharing-fields.js';
import { groupsQuery, type ItemRef } from '#src/lib/sharing-queries.js';
import { useSharingWords } from '#src/lib/sharing-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { Care, Well } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useChangeSharing } from '../api/sharing-mutations.js';
import { seesAfter } from '../model/sees-after.js';

export interface ChangeSharingDialogProps {
  item: ItemRef;
  sharing: ItemSharing;
  wanted: SharingValue | null;
  onClose: () => void;
  onHidden: (() => void) | undefined;
}

/** Chooses anew who may see a thing, and says before the step what it does: narrower at once, wider by two. */
export function ChangeSharingDialog(props: ChangeSharingDialogProps) {
  const { item, sharing, wanted, onClose, onHidden } = props;
  const { t } = useTranslation('sharing');
  const words = useProblemWords();
  const levelWords = useSharingWords();
  const say = useToast();
  const change = useChangeSharing(item);
  const { level, ...details } = sharing.sharing;
  const now: SharingValue = { level, details };
  const [value, setValue] = useState<SharingValue>(wanted ?? now);
  const [version, setVersion] = useState(sharing.version);
  const [said, setSaid] = useState<string | null>(null);
  const [refused, setRefused] = useState<ReadonlyMap<string, string>>(new Map());
  const step = stepOf(now, value);

  const save = async () => {
    const input = { level: value.level, ...value.details };
    const bad = sharingInput.safeParse(input).error?.issues ?? [];
    setSaid(null);
    setRefused(new Map(bad.map(({ path, message }) => [String(path[0]), words.field(message)])));
    if (bad.length > 0) return;
    try {
      const saved = await change.mutateAsync({ sharing: input, version });
      const isHidden = !saved.may.tighten;
      if (saved.asked !== null) say(t('panel.asked'));
      else if (step === 'wider') say(t('panel.widened'));
      else say(t(isHidden ? 'panel.narrowedHidden' : 'panel.narrowed'));
      onClose();
      if (isHidden) onHidden?.();
    } catch (cause) {
      meet(cause);
    }
  };
  const meet = (cause: unknown) => {
    const problem = cause instanceof ApiProblem ? cause : null;
    const newer = problem?.slug === 'stale' ? itemSharing.safeParse(problem.current) : null;
    if (newer?.success) {
      const { level: newLevel, ...newDetails } = newer.data.sharing;
      setVersion(newer.data.version);
      setSaid(t('panel.stale', { now: levelWords(newLevel, newDetails) }));
      return;
    }
    const fields = (problem?.errors ?? []).map(({ field, code, message }) => {
      const own = field.split('.').at(-1) ?? field;
      return [own, words.field(code, message)] as const;
    });
    setRefused(new Map(fields));
    if (fields.length === 0) setSaid(words.problem(cause));
  };

  return (
    <Dialog title={t('panel.change')} isOpen onClose={onClose} closesBeside={false}>
      <div className="grid gap-4">
        {wanted !== null && <p>{t('panel.fromForm')}</p>}
        <SharingFields
          label={t('title')}
          value={value}
          onChange={setValue}
          problem={(field) => refused.get(field)}
        />
        <StepNote step={step} sharing={sharing} value={value} communityId={item.communityId} />
        {said !== null && (
          <Care role="alert">
            <p>{said}</p>
          </Care>
        )}
        <Button
          look="main"
          full
          busy={change.isPending}
          closedBecause={step === 'same' ? t('panel.same') : undefined}
          onClick={() => void save()}
        >
          {t(step === 'wider' ? 'panel.ask' : 'panel.narrow')}
        </Button>
      </div>
    </Dialog>
  );
}

type Step = 'same' | 'narrower' | 'wider';

function stepOf(now: SharingValue, next: SharingValue): Step {
  if (sameJson(now, next)) return 'same';
  return isTighterOrSame(now, next) ? 'narrower' : 'wider';
}

interface StepNoteProps {
  step: Step;
  sharing: ItemSharing;
  value: SharingValue;
  communityId: string;
}

/** What pressing the button does, in words, before it is pressed. */
function StepNote({ step, sharing, value, communityId }: StepNoteProps) {
  const { t } = useTranslation('sharing');
  const me = useSession().person?.id ?? '';
  const { roles } = useRoles();
  const groups = useQuery(groupsQuery(communityId)).data ?? [];
  if (step === 'same') return <p className="text-small text-umber-soft">{t('panel.same')}</p>;
  if (step === 'wider') {
    return (
      <Well>
        <p>{t('panel.widerNote')}</p>
      </Well>
    );
  }
  return (
    <Care>
      <p>{t('panel.narrowNow')}</p>
      <p>{t('panel.narrowBack')}</p>
      {!seesAfter({ personId: me, roles, groups }, sharing, value) && (
        <p>
          <strong>{t('panel.hides')}</strong>
        </p>
      )}
    </Care>
  );
}
