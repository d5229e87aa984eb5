import { useTranslation } from 'react-i18next';
import type { PlaceInput } from '#shared/contracts/places.js';
import { SkylinePicture } from '#src/ui/pictures/skyline.js';
import { writeCoordinate } from '../model/coordinate.js';
import { signedDegreesText } from '../model/degrees.js';
import type { PlaceField } from '../model/place-draft.js';
import { heightScale, turnView } from '../model/skyline-edit.js';
import { withoutFullTurn } from '../model/skyline-text.js';
import { zoneName } from '../model/time-zone.js';
import { ClarityMonths } from './clarity-months.js';
import { RainMonths } from './rain-months.js';
import { useSkylineWords } from './skyline-words.js';

/** One field of a place as a person reads it: to read only, or to choose between two states. */
export function PlaceFieldValue({ field, place }: { field: PlaceField; place: PlaceInput }) {
  const { t, i18n } = useTranslation('places');
  const shift = (value: number) =>
    value === 0 ? t('rule.noShift') : t('rule.shift', { degrees: signedDegreesText(value, i18n.language) });
  switch (field) {
    case 'name':
      return place.name;
    case 'latitudeDeg':
      return <bdi dir="ltr">{writeCoordinate(place.latitudeDeg, 'latitude')}</bdi>;
    case 'longitudeDeg':
      return <bdi dir="ltr">{writeCoordinate(place.longitudeDeg, 'longitude')}</bdi>;
    case 'elevationM':
      return t('stale.metres', { value: new Intl.NumberFormat(i18n.language).format(place.elevationM) });
    case 'timeZone':
      return zoneName(place.timeZone);
    case 'skyline':
      return <SmallSkyline place={place} />;
    case 'clarityByMonth':
      return <ClarityMonths clarityByMonth={place.clarityByMonth} />;
    case 'rainMonths':
      return <RainMonths rainMonths={place.rainMonths} />;
    case 'thresholdSet':
      return t(`rule.set.${place.thresholdSet}.name`);
    case 'sameSideShiftDeg':
      return shift(place.sameSideShiftDeg);
    case 'oppositeSideShiftDeg':
      return shift(place.oppositeSideShiftDeg);
    case 'skylineRule':
      return t(`rule.skylineRule.${place.skylineRule}.name`);
  }
}

function SmallSkyline({ place }: { place: PlaceInput }) {
  const { t } = useTranslation('places');
  const words = useSkylineWords();
  const points = withoutFullTurn(place.skyline);
  const { topDeg, bottomDeg } = heightScale(points);
  return (
    <>
      <SkylinePicture
        points={points}
        view={{ ...turnView(null), topDeg, bottomDeg }}
        height={56}
        label={words.sentence(points, place.name)}
      />
      <span className="text-small">
        {points.length === 0 ? t('stale.level') : t('stale.skylinePoints', { count: points.length })}
      </span>
    </>
  );
}
