import { useTranslation } from 'react-i18next';
import { PersonSelect, SharingFields } from '#src/lib/sharing-fields.js';
import { More } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import type { SharingOfAttachment } from '../model/kept-recordings.js';

/** The two circles that serve nearly always. */
const PLAIN = ['elders', 'village'] as const;

interface CircleFieldsProps {
  label: string;
  value: SharingOfAttachment;
  onChange: (value: SharingOfAttachment) => void;
  /** Sentence for a group that is still to be chosen. */
  groupProblem: string | undefined;
}

/** Who may see or hear it: one of two, and behind a key every other circle, a season, a name. */
export function CircleFields({ label, value, onChange, groupProblem }: CircleFieldsProps) {
  const { t } = useTranslation(['attachments', 'sharing']);
  const { sharingLevel, sharing, giverId } = value;
  const plain = PLAIN.find((level) => level === sharingLevel) ?? null;
  return (
    <div className="grid gap-2">
      <PickGroup
        label={label}
        stacked
        value={plain}
        options={PLAIN.map((level) => ({
          value: level,
          label: t(`attachments:circle.${level}`),
          note: t(`attachments:circle.${level}Note`),
        }))}
        onChange={(level) => {
          onChange({ ...value, sharingLevel: level, sharing: { ...sharing, groupId: null } });
        }}
      />
      <More label={t('attachments:circle.more')}>
        <div className="mt-3 grid gap-4">
          <PersonSelect
            label={t('sharing:giver')}
            hint={t('sharing:giverHint')}
            nobody={t('sharing:giverMe')}
            value={giverId}
            onChange={(next) => {
              onChange({ ...value, giverId: next });
            }}
          />
          <SharingFields
            value={{ level: sharingLevel, details: sharing }}
            problem={(field) => (field === 'groupId' ? groupProblem : undefined)}
            onChange={({ level, details }) => {
              onChange({ ...value, sharingLevel: level, sharing: details });
            }}
          />
        </div>
      </More>
    </div>
  );
}
