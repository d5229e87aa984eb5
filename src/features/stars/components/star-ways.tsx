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
  key: 'figure' | 'look' | 'drift' | 'air';
  path: (here: Here) => string;
  /** Absent where it leads on from every star. */
  isFor?: (here: Here) => boolean;
}

/** How the keys of a village's own figures begin; the figure's id follows. */
const OWN_FIGURE = 'f-';

/** Ways on from a star's page, in their order. Another one is a line here and a text. */
const STAR_WAYS: readonly StarWay[] = [
  {
    key: 'figure',
    path: ({ markerKey }) => paths.figure(markerKey.slice(OWN_FIGURE.length)),
    isFor: ({ markerKey }) => markerKey.startsWith(OWN_FIGURE),
  },
  { key: 'look', path: ({ markerKey, placeId }) => paths.look({ marker: markerKey, placeId }) },
  { key: 'drift', path: ({ markerKey, placeId, year }) => paths.drift(markerKey, { placeId, year }) },
  { key: 'air', path: ({ markerKey, placeId, year }) => paths.air(markerKey, { placeId, year }) },
];

/** What else there is to know of a star. */
export function StarWays(here: Here) {
  const { t } = useTranslation('stars');
  return (
    <Board title={t('star.ways')}>
      <ul className="grid gap-1">
        {STAR_WAYS.filter(({ isFor }) => isFor?.(here) ?? true).map(({ key, path }) => (
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
