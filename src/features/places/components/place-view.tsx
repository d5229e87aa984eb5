import { Table2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Place } from '#shared/contracts/places.js';
import { todayIn } from '#src/lib/days.js';
import { FROM_MID, useMediaQuery } from '#src/lib/media-query.js';
import { paths } from '#src/lib/paths.js';
import { More } from '#src/ui/fold.js';
import { Columns, Mast, Page } from '#src/ui/page.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { inputOf, type PlaceField } from '../model/place-draft.js';
import type { Half } from '../model/skyline-edit.js';
import { withoutFullTurn } from '../model/skyline-text.js';
import { ClarityMonths } from './clarity-months.js';
import { EffectsSection } from './effects-section.js';
import { FIELD_NAMES } from './field-names.js';
import { PlaceFieldValue } from './place-field-value.js';
import { RainMonths } from './rain-months.js';
import { SkylineTable } from './skyline-table.js';
import { SkylineView } from './skyline-view.js';
import { OffsetWords } from './time-zone-field.js';

const FACTS: readonly PlaceField[] = ['latitudeDeg', 'longitudeDeg', 'elevationM', 'timeZone'];
const RULE_FACTS: readonly PlaceField[] = [
  'thresholdSet',
  'sameSideShiftDeg',
  'oppositeSideShiftDeg',
  'skylineRule',
];

/** A place to read. */
export function PlaceView({ place, communityName }: { place: Place; communityName: string }) {
  const { t } = useTranslation('places');
  const input = inputOf(place);
  const { year } = todayIn(place.timeZone);
  return (
    <Page>
      <Mast
        title={place.name}
        under={t('under', { village: communityName })}
        backTo={paths.villagePlaces()}
      />
      <div className="grid gap-4">
        <SkylineToRead place={place} />
        <Columns wider="first">
          <EffectsSection
            communityId={place.communityId}
            placeId={place.id}
            preview={null}
            hasSkyline={place.skyline.length > 0}
            year={year}
          />
          <div className="grid gap-4">
            <Board title={t('where')}>
              <Facts fields={FACTS} place={input} />
              <p className="mt-1 text-small text-umber-soft">
                <OffsetWords timeZone={place.timeZone} year={year} />
              </p>
            </Board>
            <Board title={t('clarity.title')}>
              <ClarityMonths clarityByMonth={place.clarityByMonth} />
              <p className="mt-2 text-small text-umber-soft">{t('clarity.hintRead')}</p>
            </Board>
            <Board title={t('rain.title')}>
              <RainMonths rainMonths={place.rainMonths} />
            </Board>
            <Board title={t('rule.title')}>
              <p className="mb-2 text-small text-umber-soft">{t('rule.trade')}</p>
              <Facts fields={RULE_FACTS} place={input} />
              <p className="mt-2 text-small text-umber-soft">
                {t('rule.source', { source: t(`rule.set.${place.thresholdSet}.source`) })}
              </p>
            </Board>
          </div>
        </Columns>
        <p className="text-small text-umber-soft">{t('readOnly')}</p>
      </div>
    </Page>
  );
}

function Facts({ fields, place }: { fields: readonly PlaceField[]; place: ReturnType<typeof inputOf> }) {
  const { t } = useTranslation('places');
  return (
    <dl className="facts">
      {fields.map((field) => (
        <div key={field} className="contents">
          <dt>{t(FIELD_NAMES[field])}</dt>
          <dd>
            <PlaceFieldValue field={field} place={place} />
          </dd>
        </div>
      ))}
    </dl>
  );
}

function SkylineToRead({ place }: { place: Place }) {
  const { t } = useTranslation(['places', 'common']);
  const isMid = useMediaQuery(FROM_MID);
  const [half, setHalf] = useState<Half>('east');
  const points = withoutFullTurn(place.skyline);
  return (
    <Board title={t('skyline.title')}>
      {points.length === 0 ? (
        <p>{t('skyline.emptyTitle')}</p>
      ) : (
        <>
          {!isMid && (
            <PickGroup
              className="mb-3"
              label={t('skyline.side')}
              labelForEars
              value={half}
              onChange={setHalf}
              options={[
                { value: 'east', label: t('skyline.eastSide') },
                { value: 'west', label: t('skyline.westSide') },
              ]}
            />
          )}
          <SkylineView
            points={points}
            placeName={place.name}
            half={isMid ? null : half}
            latitudeDeg={place.latitudeDeg}
          />
          <More label={t('common:showAsTable')} icon={<Table2 aria-hidden size={20} />}>
            <SkylineTable points={points} />
          </More>
        </>
      )}
    </Board>
  );
}
