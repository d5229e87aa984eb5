import { useTranslation } from 'react-i18next';
import { ROLES, type Role } from '#shared/contracts/people.js';
import { FieldNotes, TickField } from '#src/ui/field.js';
import { useId } from 'react';

/** Which roles a person holds: one tick each, with what it is for. */
export function RoleTicks({
  label,
  value,
  onChange,
  problem,
}: {
  label: string;
  value: readonly Role[];
  onChange: (roles: Role[]) => void;
  problem?: string | undefined;
}) {
  const { t } = useTranslation(['people', 'common']);
  const id = useId();
  return (
    <fieldset>
      <legend className="field-label">{label}</legend>
      <div className="grid gap-1">
        {ROLES.map((role) => (
          <TickField
            key={role}
            label={
              <>
                {t(`common:role.${role}`)}
                <span className="pick-note">{t(`roleNote.${role}`)}</span>
              </>
            }
            checked={value.includes(role)}
            onChange={(event) => {
              const { checked } = event.currentTarget;
              onChange(ROLES.filter((each) => (each === role ? checked : value.includes(each))));
            }}
          />
        ))}
      </div>
      <FieldNotes inputId={id} problem={problem} />
    </fieldset>
  );
}
