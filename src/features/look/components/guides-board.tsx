import { Trans, useTranslation } from 'react-i18next';
import type { Look } from '#shared/contracts/look.js';
import { eyeWay } from '#shared/kernel/hands.js';
import { markerName } from '#src/lib/marker-names.js';
import { Board } from '#src/ui/surfaces.js';
import { useLookWords } from '../model/use-look-words.js';

/** How to find it, and what not to take for it. */
export function GuidesBoard({ look }: { look: Look }) {
  const { t } = useTranslation('look');
  const words = useLookWords();
  const { best, pointers, planets } = look;
  if (best === null) return null;
  return (
    <>
      <Board title={t('planets.title')}>
        {planets.length === 0 && <p>{t('planets.none')}</p>}
        <ul className="grid gap-2">
          {planets.map((planet) => (
            <li key={planet.planet}>
              <Trans
                t={t}
                i18nKey={planet.isBrighter ? 'planets.brighter' : 'planets.like'}
                values={{
                  planet: t(`planet.${planet.planet}`),
                  hands: words.hands(planet.separationDeg),
                  place: t(`besideIt.${eyeWay(planet.bearingDeg)}`),
                  marker: markerName(look.marker),
                }}
                components={{ b: <strong /> }}
              />
            </li>
          ))}
        </ul>
      </Board>
      <Board title={t('pointers.title')}>
        {pointers.length === 0 && <p>{t('pointers.none')}</p>}
        <ul className="grid gap-2">
          {pointers.map((pointer) => (
            <li key={pointer.hr}>
              <Trans
                t={t}
                i18nKey="pointers.one"
                values={{
                  name: pointer.name,
                  compass: words.compass(pointer.azimuthDeg),
                  hands: words.hands(pointer.separationDeg),
                  way: t(`way.${eyeWay(pointer.bearingDeg)}`),
                }}
                components={{ b: <strong /> }}
              />
            </li>
          ))}
        </ul>
      </Board>
    </>
  );
}
