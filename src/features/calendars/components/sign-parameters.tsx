import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import {
  DARK_NIGHT_ENDS,
  FACINGS,
  MOON_COUNT,
  MOON_EVENTS,
  NIGHT_DEPTHS_DEG,
  NOON_SUN_PASSAGES,
  PHENOMENA,
  POINT_NAME_MAX,
  POLE_POSITIONS,
  SKY_SIDES,
  STAR_ALTITUDE_DEG,
  SUN_EVENTS,
  TWILIGHT_DEPTHS_DEG,
  TWILIGHTS,
  VENUS_APPEARANCES,
} from '#shared/sky/vocabulary.js';
import { compassPoint } from '#src/lib/sky-words.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import { SkyHourFields } from './sky-hour-fields.js';
import { SolarHourStepper } from './solar-hour-stepper.js';

interface SignParametersProps {
  spec: SkyMarkerSpec;
  /** The sentence for a parameter, or undefined while all is well. */
  at: (parameter: string) => string | undefined;
  onChange: (spec: SkyMarkerSpec) => void;
}

/** What can be set about a sign, besides its star. A kind without parameters shows nothing. */
export function SignParameters({ spec, at, onChange }: SignParametersProps): ReactNode {
  const { t } = useTranslation(['calendars', 'sky']);
  const pick = useWordPick();
  switch (spec.kind) {
    case 'culmination':
      return (
        <>
          {pick('twilight', TWILIGHTS, spec.twilight, (twilight) => onChange({ ...spec, twilight }))}
          <DepthPick
            depths={TWILIGHT_DEPTHS_DEG}
            value={spec.depthDeg}
            onChange={(depthDeg) => onChange({ ...spec, depthDeg })}
          />
        </>
      );
    case 'star-altitude':
      return (
        <>
          <Stepper
            label={t('sign.altitude')}
            hint={t('sign.altitudeHint')}
            value={spec.altitudeDeg}
            {...STAR_ALTITUDE_DEG}
            bigStep={10}
            format={(degrees) => t('sign.degrees', { degrees })}
            problem={at('altitudeDeg')}
            onChange={(altitudeDeg) => onChange({ ...spec, altitudeDeg })}
          />
          {pick('side', SKY_SIDES, spec.side, (side) => onChange({ ...spec, side }))}
          <SkyHourFields at={spec.at} onChange={(hour) => onChange({ ...spec, at: hour })} />
        </>
      );
    case 'due-meridian':
      return (
        <>
          {pick('facing', FACINGS, spec.facing, (facing) => onChange({ ...spec, facing }))}
          <SolarHourStepper
            value={spec.solarHour}
            onChange={(solarHour) => onChange({ ...spec, solarHour })}
          />
        </>
      );
    case 'about-pole':
      return (
        <>
          {pick('position', POLE_POSITIONS, spec.position, (position) => onChange({ ...spec, position }))}
          <SolarHourStepper
            value={spec.solarHour}
            onChange={(solarHour) => onChange({ ...spec, solarHour })}
          />
        </>
      );
    case 'sun-azimuth':
      return (
        <>
          {pick('event', SUN_EVENTS, spec.event, (event) => onChange({ ...spec, event }))}
          <Stepper
            label={t('sign.azimuth')}
            hint={t(`sky:compass.${compassPoint(spec.azimuthDeg)}`)}
            value={spec.azimuthDeg}
            min={0}
            max={360}
            step={0.5}
            bigStep={5}
            format={(degrees) => t('sign.degrees', { degrees })}
            problem={at('azimuthDeg')}
            onChange={(azimuthDeg) => onChange({ ...spec, azimuthDeg })}
          />
          <TextField
            label={t('sign.pointName')}
            hint={t('sign.pointNameHint')}
            value={spec.pointName}
            maxLength={POINT_NAME_MAX}
            problem={at('pointName')}
            onChange={(event) => onChange({ ...spec, pointName: event.currentTarget.value })}
          />
        </>
      );
    case 'noon-sun':
      return (
        <>
          {pick('passage', NOON_SUN_PASSAGES, spec.passage, (passage) => onChange({ ...spec, passage }))}
          <TextField
            label={t('sign.ridgeName')}
            hint={t('sign.ridgeNameHint')}
            value={spec.ridgeName}
            maxLength={POINT_NAME_MAX}
            problem={at('ridgeName')}
            onChange={(event) => onChange({ ...spec, ridgeName: event.currentTarget.value })}
          />
        </>
      );
    case 'dark-night':
      return (
        <>
          {pick('end', DARK_NIGHT_ENDS, spec.end, (end) => onChange({ ...spec, end }))}
          <DepthPick
            depths={NIGHT_DEPTHS_DEG}
            value={spec.depthDeg}
            onChange={(depthDeg) => onChange({ ...spec, depthDeg })}
          />
        </>
      );
    case 'moon-phase':
      return pick('moonEvent', MOON_EVENTS, spec.event, (event) => onChange({ ...spec, event }));
    case 'moon-counted':
      return (
        <>
          <PickGroup
            label={t('sign.phenomenon')}
            value={spec.phenomenon}
            onChange={(phenomenon) => onChange({ ...spec, phenomenon })}
            options={PHENOMENA.map((value) => ({ value, label: t(`sky:phenomenonTitle.${value}`) }))}
          />
          {pick('moonEvent', MOON_EVENTS, spec.event, (event) => onChange({ ...spec, event }))}
          <Stepper
            label={t('sign.moonCount')}
            value={spec.count}
            {...MOON_COUNT}
            bigStep={3}
            problem={at('count')}
            onChange={(count) => onChange({ ...spec, count })}
          />
        </>
      );
    case 'venus-appearance':
      return pick('appearance', VENUS_APPEARANCES, spec.appearance, (appearance) =>
        onChange({ ...spec, appearance }),
      );
    case 'sun-season':
    case 'zenith-sun':
      return null;
  }
}

/** A choice among a parameter's words. */
function useWordPick() {
  const { t } = useTranslation('calendars');
  return <T extends string>(
    name: string,
    words: readonly T[],
    value: T,
    onChange: (word: T) => void,
  ): ReactNode => (
    <PickGroup
      label={t(`sign.${name as 'twilight'}.label`)}
      value={value}
      onChange={onChange}
      options={words.map((word) => ({
        value: word,
        label: t(`sign.${name}.${word}` as 'sign.twilight.dusk'),
      }))}
    />
  );
}

/** Every depth that a sign can have, by the word of its note. */
const DEPTH_WORDS = { 6: 'civil', 9: 'between', 12: 'nautical', 15: 'milkyWay', 18: 'night' } as const;

function DepthPick<T extends keyof typeof DEPTH_WORDS>({
  depths,
  value,
  onChange,
}: {
  depths: readonly T[];
  value: T;
  onChange: (depthDeg: T) => void;
}) {
  const { t } = useTranslation('calendars');
  return (
    <PickGroup
      label={t('sign.depth.label')}
      hint={t('sign.depth.hint')}
      value={String(value)}
      onChange={(text) => {
        const depth = depths.find((one) => String(one) === text);
        if (depth !== undefined) onChange(depth);
      }}
      options={depths.map((depth) => ({
        value: String(depth),
        label: t('sign.depth.value', { depth }),
        note: t(`sign.depth.note.${DEPTH_WORDS[depth]}`),
      }))}
    />
  );
}
