import { ClipboardPaste, Table2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { SkylinePoint } from '#shared/contracts/places.js';
import { listWords } from '#src/lib/list-words.js';
import { FROM_MID, useMediaQuery } from '#src/lib/media-query.js';
import { Button } from '#src/ui/button.js';
import { classNames } from '#src/ui/class-names.js';
import { More } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { EmptyState } from '#src/ui/waiting.js';
import { readCoordinate } from '../model/coordinate.js';
import { skylineOf } from '../model/place-draft.js';
import { eightPoints, halfOf, heightScale, movePoint, putBack, type Half } from '../model/skyline-edit.js';
import { writeSkylineText } from '../model/skyline-text.js';
import type { FieldPart } from './place-form-parts.js';
import { PointPanel } from './point-panel.js';
import { DrawnRings, RingKeys } from './skyline-rings.js';
import { SkylineTable } from './skyline-table.js';
import { SkylineTableEditor } from './skyline-table-editor.js';
import { SkylineView } from './skyline-view.js';
import { useSkylineWords } from './skyline-words.js';

/** The skyline of the place: rings to drag and to step, or a table; the picture follows either. */
export function SkylineBoard(part: FieldPart) {
  const { draft, change } = part;
  const { t, i18n } = useTranslation(['places', 'common']);
  const words = useSkylineWords();
  const isMid = useMediaQuery(FROM_MID);
  const points = skylineOf(draft);
  const usesRings = draft.skylineText === null;
  const [selected, setSelected] = useState(() => highestOf(points));
  const [shownHalf, setShownHalf] = useState<Half>('east');
  const [heldScale, setHeldScale] = useState<ReturnType<typeof heightScale> | undefined>(undefined);

  const chosen = Math.min(selected, points.length - 1);
  const half = isMid ? null : shownHalf;
  const scale = heldScale ?? heightScale(points);
  const latitude = readCoordinate(draft.latitude, 'latitude');
  const setPoints = (skyline: SkylinePoint[]) => {
    change({ skyline });
  };
  const select = (index: number) => {
    setSelected(index);
    const azimuthDeg = points[index]?.azimuthDeg;
    if (azimuthDeg !== undefined) setShownHalf(halfOf(azimuthDeg));
  };
  const levels = listWords(
    scale.levelsDeg.map((level) => t('skyline.degrees', { value: words.degrees(level) })),
    i18n.language,
  );
  const openTable = () => {
    change({ skylineText: writeSkylineText(points) });
  };

  if (points.length === 0 && usesRings) {
    return (
      <Board title={t('skyline.title')}>
        <EmptyState
          title={t('skyline.emptyTitle')}
          action={
            <div className="flex flex-wrap gap-3">
              <Button
                onClick={() => {
                  setPoints(eightPoints());
                  setSelected(2);
                }}
              >
                {t('skyline.begin')}
              </Button>
              <Button look="quiet" onClick={openTable}>
                {t('skyline.pasteInstead')}
              </Button>
            </div>
          }
        >
          {t('skyline.emptyHint')}
        </EmptyState>
      </Board>
    );
  }
  return (
    <Board title={t('skyline.title')}>
      <div
        className={classNames(
          'grid gap-4 wide:gap-6',
          usesRings ? 'wide:grid-cols-[minmax(0,1fr)_15rem]' : 'wide:grid-cols-[minmax(0,1fr)_27rem]',
        )}
      >
        <div className="min-w-0">
          {half !== null && (
            <PickGroup
              className="mb-3"
              label={t('skyline.side')}
              labelForEars
              value={half}
              onChange={(next) => {
                setShownHalf(next);
                const first = points.findIndex((point) => halfOf(point.azimuthDeg) === next);
                if (first >= 0) setSelected(first);
              }}
              options={[
                { value: 'east', label: t('skyline.eastSide') },
                { value: 'west', label: t('skyline.westSide') },
              ]}
            />
          )}
          <SkylineView
            points={points}
            placeName={draft.name}
            half={half}
            latitudeDeg={latitude.ok ? latitude.valueDeg : null}
            scale={scale}
            inFront={(pixels) =>
              usesRings && <DrawnRings points={points} selected={chosen} half={half} scale={pixels} />
            }
            onTop={(pixels) =>
              usesRings && (
                <RingKeys
                  points={points}
                  selected={chosen}
                  half={half}
                  scale={pixels}
                  onSelect={select}
                  onStep={(index, to) => {
                    setPoints(movePoint(points, index, to));
                  }}
                  onDrag={
                    isMid
                      ? (index, to, isEnd) => {
                          setHeldScale(isEnd ? undefined : scale);
                          setPoints(movePoint(points, index, to));
                        }
                      : null
                  }
                />
              )
            }
          />
          <p className="mt-1 text-small text-umber-soft">
            {t('skyline.levels', { levels })}{' '}
            {usesRings && t(isMid ? 'skyline.dragOrStep' : 'skyline.stepOnly')}
          </p>
          {usesRings && (
            <Button
              look="quiet"
              className="-ms-2"
              icon={<ClipboardPaste aria-hidden size={20} />}
              onClick={openTable}
            >
              {t('skyline.pasteInstead')}
            </Button>
          )}
        </div>
        {usesRings ? (
          <PointPanel
            points={points}
            selected={chosen}
            onSelect={select}
            onChange={setPoints}
            onPutBack={(point) => {
              change((now) => ({ skyline: putBack(now.skyline, point) }));
              setShownHalf(halfOf(point.azimuthDeg));
            }}
          />
        ) : (
          <SkylineTableEditor {...part} text={draft.skylineText ?? ''} />
        )}
      </div>
      <More label={t('common:showAsTable')} icon={<Table2 aria-hidden size={20} />}>
        <SkylineTable points={points} />
      </More>
    </Board>
  );
}

function highestOf(points: readonly SkylinePoint[]): number {
  let best = 0;
  points.forEach((point, index) => {
    if (point.altitudeDeg > (points[best]?.altitudeDeg ?? -Infinity)) best = index;
  });
  return best;
}
