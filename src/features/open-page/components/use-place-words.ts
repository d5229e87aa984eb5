import { useTranslation } from 'react-i18next';
import type { OpenPage } from '#shared/contracts/open-page.js';

/** Where it is, as far as the village tells; null where it tells nothing. */
export function usePlaceWords(): (page: Pick<OpenPage, 'place' | 'placeName'>) => string | null {
  const { t, i18n } = useTranslation('open');
  return ({ place, placeName }) => {
    if (place === null) return placeName === null ? null : t('place', { place: placeName });
    const format = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 1 });
    const degrees = (deg: number) => format.format(Math.abs(deg));
    const { latitudeDeg, longitudeDeg } = place;
    const latitude = t(latitudeDeg < 0 ? 'south' : 'north', { degrees: degrees(latitudeDeg) });
    const longitude = t(longitudeDeg < 0 ? 'west' : 'east', { degrees: degrees(longitudeDeg) });
    return t(placeName === null ? 'placeOnly' : 'placeAbout', {
      place: placeName ?? '',
      latitude,
      longitude,
    });
  };
}
