import { ArrowLeftRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { VersionSummary } from '#shared/contracts/versions.js';
import { IconButton } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { StateChip } from '#src/ui/state-chip.js';
import type { Sides } from '../model/compare-sides.js';
import { useVersionName } from './use-version-name.js';

interface CompareSidesProps {
  sides: Sides;
  versions: readonly VersionSummary[];
  choices: readonly string[];
  onChange: (sides: Sides) => void;
}

/** The two that stand beside each other. */
export function CompareSides({ sides, versions, choices, onChange }: CompareSidesProps) {
  const { t } = useTranslation('versions');
  return (
    <div className="compare-sides">
      <Side side="from" {...{ sides, versions, choices, onChange }} />
      <IconButton
        label={t('compare.swap')}
        icon={<ArrowLeftRight aria-hidden size={22} />}
        onClick={() => {
          onChange({ from: sides.to, to: sides.from });
        }}
      />
      <Side side="to" {...{ sides, versions, choices, onChange }} />
    </div>
  );
}

function Side({ side, sides, versions, choices, onChange }: CompareSidesProps & { side: keyof Sides }) {
  const { t } = useTranslation(['versions', 'common']);
  const nameOf = useVersionName();
  const chosen = sides[side];
  const find = (number: string) => versions.find((each) => String(each.number) === number);
  const version = find(chosen);
  return (
    <div className="compare-side">
      <SelectField
        label={t(`compare.${side}`)}
        value={chosen}
        onChange={(event) => {
          onChange({ ...sides, [side]: event.currentTarget.value });
        }}
      >
        {choices.map((number) => {
          const each = find(number);
          return (
            <option key={number} value={number}>
              {each ? nameOf(each) : t('name.draft')}
            </option>
          );
        })}
      </SelectField>
      <StateChip state={version?.state ?? 'draft'} />
    </div>
  );
}
