import { useTranslation } from 'react-i18next';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';

interface Here {
  markerKey: string;
  placeId: string;
  year: number;
}

/** One way on from a star: its words are `stars:star.way.<key>`. */
interface StarWay {
  key: 'drift' | 'air';
  path: (here: Here) => string;
}

/** Ways on from a star's page, in their order. Another one is a line here and a text. */
const STAR_WAYS: readonly StarWay[] = [
  { key: 'drift', path: ({ markerKey, placeId, year }) => paths.drift(markerKey, { placeId, year }) },
  { key: 'air', path: ({ markerKey, placeId, year }) => paths.air(markerKey, { placeId, year }) },
];

/** What else there is to know of a star. */
export function StarWays(here: Here) {
  const { t } = useTranslation('stars');
  return (
    <Board title={t('star.ways')}>
      <ul className="grid gap-1">
        {STAR_WAYS.map(({ key, path }) => (
          <li key={key}>
            <ButtonLink look="quiet" className="-ms-2" to={path(here)}>
              {t(`star.way.${key}`)}
            </ButtonLink>
          </li>
        ))}
      </ul>
    </Board>
  );
}
