import { Map } from 'lucide-react';
import { lazy, Suspense, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { Skeleton } from '#src/ui/waiting.js';
import { readCoordinate, writeCoordinate } from '../model/coordinate.js';
import type { FieldPart } from './place-form-parts.js';

/** The map with its coastlines comes when it is asked for. */
const WorldMap = lazy(() => import('./world-map.js'));

/** The coordinates on a map: a tap writes them, typing them moves the peg. */
export function MapField({ draft, change }: FieldPart) {
  const { t } = useTranslation('places');
  const [isOpen, setOpen] = useState(false);
  const latitude = readCoordinate(draft.latitude, 'latitude');
  const longitude = readCoordinate(draft.longitude, 'longitude');
  return (
    <div className="grid gap-3">
      <div>
        <Button
          icon={<Map aria-hidden size={20} />}
          aria-expanded={isOpen}
          onClick={() => {
            setOpen(!isOpen);
          }}
        >
          {t(isOpen ? 'map.close' : 'map.open')}
        </Button>
      </div>
      {isOpen && (
        <Suspense fallback={<Skeleton lines={4} />}>
          <WorldMap
            place={
              latitude.ok && longitude.ok
                ? { latitudeDeg: latitude.valueDeg, longitudeDeg: longitude.valueDeg }
                : null
            }
            onPick={({ latitudeDeg, longitudeDeg }) => {
              change({
                latitude: writeCoordinate(latitudeDeg, 'latitude'),
                longitude: writeCoordinate(longitudeDeg, 'longitude'),
              });
            }}
          />
        </Suspense>
      )}
    </div>
  );
}
