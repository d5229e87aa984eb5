import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Entry, EntryInput } from '#shared/contracts/calendars.js';
import { useDateWords } from '#src/lib/date-words.js';
import type { NamesByKey } from '#src/lib/entry-words.js';
import { Button } from '#src/ui/button.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import {
  clashesOf,
  isOfRecord,
  joined,
  recordPartOf,
  stillStanding,
  type Choices,
  type Clash,
  type Side,
} from '../model/stale-choice.js';
import { UnitValue } from './unit-value.js';

interface StaleChoiceProps {
  base: EntryInput | null;
  theirs: Entry;
  mine: EntryInput;
  markers: NamesByKey;
  isSaving: boolean;
  onSave: (content: EntryInput) => void;
  onTakeTheirs: () => void;
}

interface Chosen {
  /** Their text that lay open as it was chosen. */
  over: EntryInput;
  choices: Choices;
  /** They saved once more, and something is to be chosen anew. */
  again: boolean;
}

/** Somebody saved a newer text: both stand side by side, part by part, and a person says what stays. */
export function StaleChoice(props: StaleChoiceProps) {
  const { base, theirs, mine, markers, isSaving, onSave, onTakeTheirs } = props;
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const [chosen, setChosen] = useState<Chosen>({ over: theirs.content, choices: {}, again: false });
  if (chosen.over !== theirs.content) {
    const choices = stillStanding(chosen.choices, chosen.over, theirs.content);
    const again = Object.keys(choices).length < Object.keys(chosen.choices).length;
    setChosen({ over: theirs.content, choices, again });
  }
  const { choices, again } = chosen;
  const clashes = clashesOf(base, theirs.content, mine);
  const result = joined(clashes, choices, theirs.content, mine);
  const name = theirs.updatedBy;
  return (
    <section aria-labelledby="stale-title" className="mt-3 grid gap-4">
      <Care>
        <h3 id="stale-title" className="text-body">
          <strong>{t('stale.title')}</strong>
        </h3>
        <p>{t('stale.lead', { name, when: dates.moment(theirs.updatedAt) })}</p>
        {again && <p role="status">{t('stale.again', { name })}</p>}
      </Care>
      {clashes.map((clash) => (
        <ClashPick
          key={clash.unit}
          clash={clash}
          name={name}
          value={choices[clash.unit] ?? clash.first}
          theirs={theirs.content}
          mine={mine}
          markers={markers}
          onChange={(side) => {
            setChosen((before) => ({ ...before, choices: { ...before.choices, [clash.unit]: side } }));
          }}
        />
      ))}
      <div className="flex flex-wrap gap-3">
        <Button
          look="main"
          busy={isSaving}
          closedBecause={result === null ? t('stale.missing') : undefined}
          onClick={() => {
            if (result !== null) onSave(result);
          }}
        >
          {t('stale.save')}
        </Button>
        <Button look="quiet" onClick={onTakeTheirs}>
          {t('stale.throwMine', { name })}
        </Button>
      </div>
    </section>
  );
}

interface ClashPickProps {
  clash: Clash;
  name: string;
  value: Side | null;
  theirs: EntryInput;
  mine: EntryInput;
  markers: NamesByKey;
  onChange: (side: Side) => void;
}

function ClashPick({ clash: { unit, first }, name, value, theirs, mine, markers, onChange }: ClashPickProps) {
  const { t } = useTranslation('calendars');
  const who =
    first === 'mine'
      ? t('stale.onlyYou')
      : first === 'theirs'
        ? t('stale.onlyThey', { name })
        : t('stale.both');
  return (
    <PickGroup
      label={isOfRecord(unit) ? t(`stale.part.${recordPartOf(unit)}`) : t(`stale.unit.${unit}`)}
      hint={who}
      stacked
      className="two-texts"
      value={value}
      onChange={onChange}
      options={[
        {
          value: 'theirs',
          label: <UnitValue unit={unit} content={theirs} markers={markers} />,
          note: t('stale.theirs', { name }),
        },
        {
          value: 'mine',
          label: <UnitValue unit={unit} content={mine} markers={markers} />,
          note: t('stale.mine'),
        },
      ]}
    />
  );
}
