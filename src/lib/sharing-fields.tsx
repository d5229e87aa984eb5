import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import {
  NAMINGS,
  SHARING_LEVELS,
  TRACES,
  type SharingDetails,
  type SharingLevel,
} from '#shared/contracts/sharing.js';
import { SelectField, TickField } from '#src/ui/field.js';
import { MonthDaySelect } from '#src/ui/month-day-select.js';
import { PickGroup } from '#src/ui/pick.js';
import { Well } from '#src/ui/surfaces.js';
import { useCurrentCommunity, useRoles } from './community.js';
import { useDateWords } from './date-words.js';
import { groupsQuery, villagePeopleQuery } from './sharing-queries.js';

export interface SharingValue {
  level: SharingLevel;
  details: SharingDetails;
}

export interface SharingFieldsProps {
  value: SharingValue;
  onChange: (value: SharingValue) => void;
  /** The sentence for a field, or undefined while all is well. */
  problem: (field: 'level' | 'groupId' | 'successorId' | 'tellingSeason') => string | undefined;
  label?: string | undefined;
  hint?: string | undefined;
  /** Which levels can be chosen; all of them where nothing is said. */
  levels?: readonly SharingLevel[] | undefined;
}

const PLAIN_YEAR = 2027;
const A_MONTH = { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } };

/** Who may see a thing; what it takes further is asked only where the level needs it. */
export function SharingFields({
  value,
  onChange,
  problem,
  label,
  hint,
  levels = SHARING_LEVELS,
}: SharingFieldsProps) {
  const { t } = useTranslation('sharing');
  const { level, details } = value;
  const change = (changed: Partial<SharingDetails>) => {
    onChange({ level, details: { ...details, ...changed } });
  };
  const narrow = level === 'group' || level === 'elders' || level === 'sealed';
  return (
    <div className="grid gap-4">
      <PickGroup
        label={label ?? t('title')}
        hint={hint}
        stacked
        value={level}
        problem={problem('level')}
        onChange={(next) => {
          onChange({
            level: next,
            details: { ...details, groupId: next === 'group' ? details.groupId : null },
          });
        }}
        options={levels.map((one) => ({
          value: one,
          label: t(`level.${one}.name`),
          note: t(`level.${one}.note`),
        }))}
      />
      {level === 'group' && (
        <GroupField value={details.groupId} problem={problem('groupId')} onChange={change} />
      )}
      {narrow && level !== 'sealed' && (
        <PickGroup
          label={t('trace')}
          stacked
          value={details.trace}
          onChange={(trace) => {
            change({ trace });
          }}
          options={TRACES.map((one) => ({
            value: one,
            label: t(`traces.${one}.name`),
            note: t(`traces.${one}.note`),
          }))}
        />
      )}
      <SeasonFields details={details} problem={problem('tellingSeason')} onChange={change} />
      {(level === 'sealed' || details.tellingSeason !== null) && (
        <SuccessorField value={details.successorId} problem={problem('successorId')} onChange={change} />
      )}
      <PickGroup
        label={t('naming')}
        stacked
        value={details.naming}
        onChange={(naming) => {
          change({ naming });
        }}
        options={NAMINGS.map((one) => ({
          value: one,
          label: t(`namings.${one}.name`),
          note: t(`namings.${one}.note`),
        }))}
      />
    </div>
  );
}

interface PartProps<V> {
  value: V;
  problem: string | undefined;
  onChange: (changed: Partial<SharingDetails>) => void;
}

function GroupField({ value, problem, onChange }: PartProps<string | null>) {
  const { t } = useTranslation('sharing');
  const { communityId } = useCurrentCommunity();
  const groups = useQuery(groupsQuery(communityId));
  if (groups.data?.length === 0) return <p className="text-small text-umber-soft">{t('noGroups')}</p>;
  return (
    <SelectField
      label={t('group')}
      hint={t('groupHint')}
      problem={problem}
      value={value ?? ''}
      onChange={(event) => {
        onChange({ groupId: event.currentTarget.value === '' ? null : event.currentTarget.value });
      }}
    >
      <option value="">{t('chooseGroup')}</option>
      {(groups.data ?? []).map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </SelectField>
  );
}

function SuccessorField({ value, problem, onChange }: PartProps<string | null>) {
  const { t } = useTranslation('sharing');
  return (
    <PersonSelect
      label={t('successor')}
      hint={t('successorHint')}
      nobody={t('nobody')}
      value={value}
      problem={problem}
      onChange={(successorId) => {
        onChange({ successorId });
      }}
    />
  );
}

export interface PersonSelectProps {
  label: string;
  hint?: string | undefined;
  /** What stands for none of them. */
  nobody: string;
  value: string | null;
  problem?: string | undefined;
  onChange: (personId: string | null) => void;
}

/** One of the village's people; nothing for those who may not read who belongs to it. */
export function PersonSelect({ label, hint, nobody, value, problem, onChange }: PersonSelectProps) {
  const { communityId } = useCurrentCommunity();
  const readsPeople = useRoles().is('steward', 'officer', 'elder');
  const people = useQuery({ ...villagePeopleQuery(communityId), enabled: readsPeople });
  if (!readsPeople) return null;
  return (
    <SelectField
      label={label}
      hint={hint}
      problem={problem}
      value={value ?? ''}
      onChange={(event) => {
        onChange(event.currentTarget.value === '' ? null : event.currentTarget.value);
      }}
    >
      <option value="">{nobody}</option>
      {(people.data ?? []).map(({ id, displayName }) => (
        <option key={id} value={id}>
          {displayName}
        </option>
      ))}
    </SelectField>
  );
}

function SeasonFields({
  details,
  problem,
  onChange,
}: {
  details: SharingDetails;
  problem: string | undefined;
  onChange: (changed: Partial<SharingDetails>) => void;
}) {
  const { t } = useTranslation('sharing');
  const months = useDateWords().months(PLAIN_YEAR);
  const season = details.tellingSeason;
  return (
    <div className="grid gap-3">
      <TickField
        label={t('season')}
        hint={t('seasonHint')}
        checked={season !== null}
        problem={problem}
        onChange={(event) => {
          onChange({ tellingSeason: event.currentTarget.checked ? A_MONTH : null });
        }}
      />
      {season !== null && (
        <Well className="grid gap-3 mid:grid-cols-2">
          {(['from', 'to'] as const).map((end) => (
            <MonthDaySelect
              key={end}
              label={t(end === 'from' ? 'seasonFrom' : 'seasonTo')}
              months={months}
              value={season[end]}
              onChange={(date) => {
                onChange({ tellingSeason: { ...season, [end]: date } });
              }}
            />
          ))}
        </Well>
      )}
    </div>
  );
}
