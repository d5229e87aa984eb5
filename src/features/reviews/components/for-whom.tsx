import { useTranslation } from 'react-i18next';
import { PIN_MAX } from '#shared/contracts/cards.js';
import type { ElderProgress } from '#shared/contracts/reviews.js';
import { SelectField, TextField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';

/** On whose behalf an officer or the steward writes, and who heard it. */
export interface Spokesman {
  elderId: string;
  witness: string;
  /** Typed by the elder for one answer; forgotten with it. */
  pin: string;
}

export interface SpokesmanProblem {
  elder?: string | undefined;
  witness?: string | undefined;
  pin?: string | undefined;
}

export function ForWhom({
  elders,
  value,
  onChange,
  problem,
}: {
  elders: readonly ElderProgress[];
  value: Spokesman;
  onChange: (value: Spokesman) => void;
  problem: SpokesmanProblem;
}) {
  const { t } = useTranslation('reviews');
  return (
    <Board title={t('forElder')}>
      <div className="grid gap-4">
        <SelectField
          label={t('whichElder')}
          value={value.elderId}
          problem={problem.elder}
          onChange={(event) => {
            onChange({ ...value, elderId: event.currentTarget.value });
          }}
        >
          <option value="">–</option>
          {elders
            .filter((elder) => !elder.signed)
            .map((elder) => (
              <option key={elder.elderId} value={elder.elderId}>
                {elder.elderName}
              </option>
            ))}
        </SelectField>
        <TextField
          label={t('witness')}
          hint={t('witnessHint')}
          value={value.witness}
          problem={problem.witness}
          maxLength={120}
          onChange={(event) => {
            onChange({ ...value, witness: event.currentTarget.value });
          }}
        />
        <TextField
          label={t('pin')}
          hint={t('pinHint')}
          type="password"
          inputMode="numeric"
          autoComplete="off"
          value={value.pin}
          problem={problem.pin}
          maxLength={PIN_MAX}
          onChange={(event) => {
            onChange({ ...value, pin: event.currentTarget.value.replace(/\D/gu, '') });
          }}
        />
      </div>
    </Board>
  );
}
