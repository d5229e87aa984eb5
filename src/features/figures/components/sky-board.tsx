import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Chart } from '#shared/contracts/figures.js';
import { ComboField } from '#src/ui/combo-field.js';
import { FieldNotes, SelectField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { viewAround, type ChartView, type SkyPoint } from '../model/chart-projection.js';
import { beginWith, toggleStar } from '../model/figure-draft.js';
import { readDeclination, readRightAscension, writeDegrees } from '../model/sky-coordinate.js';
import { ChosenStars } from './chosen-stars.js';
import type { FigurePart } from './figure-form-parts.js';
import { PatchFields } from './patch-fields.js';
import { StarPicker } from './star-picker.js';
import { useChartNames } from './use-chart-names.js';

/** Where an empty form opens: Orion's belt, which almost everybody on Earth can find. */
const FIRST_VIEW: ChartView = { centre: { rightAscensionDeg: 84, declinationDeg: 0 }, radiusDeg: 18 };
const PATCH_RADIUS_DEG = 20;

/** What of the sky it is: stars, one of which leads, or a patch. */
export function SkyBoard({ draft, change, problem, chart }: FigurePart & { chart: Chart }) {
  const { t } = useTranslation('figures');
  const nameOf = useChartNames();
  const byHr = useMemo(() => new Map(chart.stars.map((star) => [star.hr, star])), [chart]);
  const members = draft.memberHrs.flatMap((hr) => byHr.get(hr) ?? []);
  const isPatch = draft.leads === 'patch';
  const patch = isPatch ? patchOf(draft.rightAscension, draft.declination) : null;
  const [view, setView] = useState<ChartView>(
    () => (patch ? { centre: patch, radiusDeg: PATCH_RADIUS_DEG } : viewAround(members)) ?? FIRST_VIEW,
  );
  const options = useMemo(
    () => chart.stars.map((star) => ({ id: String(star.hr), text: labelOf(nameOf(star), star.designation) })),
    [chart, nameOf],
  );
  const toggle = (hr: number) => {
    change(toggleStar(draft, hr, (one) => byHr.get(one)?.vMag ?? 99));
  };
  const setPatch = ({ rightAscensionDeg, declinationDeg }: SkyPoint) => {
    change({ rightAscension: writeDegrees(rightAscensionDeg), declination: writeDegrees(declinationDeg) });
  };
  const begin = (key: string) => {
    const found = chart.startingPoints.find((one) => one.key === key);
    if (!found) return;
    change(beginWith(found));
    setView(viewAround(found.memberHrs.flatMap((hr) => byHr.get(hr) ?? [])) ?? view);
  };
  return (
    <Board title={t('form.sky')}>
      <div className="grid gap-4">
        <PickGroup
          label={t('form.leadsWhat')}
          value={draft.leads}
          onChange={(leads) => {
            change({ leads });
          }}
          options={[
            { value: 'stars', label: t('form.stars') },
            { value: 'patch', label: t('form.patch') },
          ]}
        />
        {isPatch ? (
          <PatchFields
            draft={draft}
            change={change}
            problem={problem}
            onPlaced={() => {
              if (patch) setView((before) => ({ ...before, centre: patch }));
            }}
          />
        ) : (
          <div className="grid gap-4 mid:grid-cols-2">
            <SelectField
              label={t('form.begin')}
              hint={t('form.beginHint')}
              value=""
              onChange={(event) => {
                begin(event.currentTarget.value);
              }}
            >
              <option value="">{t('form.beginNone')}</option>
              {chart.startingPoints.map(({ key }) => (
                <option key={key} value={key}>
                  {t(`starting.${key as 'pleiades'}`)}
                </option>
              ))}
            </SelectField>
            <ComboField
              key={draft.memberHrs.join()}
              label={t('form.byName')}
              hint={t('form.byNameHint')}
              options={options}
              value={null}
              onChange={(id) => {
                const star = byHr.get(Number(id));
                if (!star) return;
                if (!draft.memberHrs.includes(star.hr)) toggle(star.hr);
                setView({ ...view, centre: star });
              }}
            />
          </div>
        )}
        <div id="figure-memberHrs" tabIndex={-1}>
          <StarPicker
            stars={chart.stars}
            view={view}
            onView={setView}
            memberHrs={draft.memberHrs}
            indicatorHr={isPatch ? null : draft.indicatorHr}
            patch={patch}
            nameOf={nameOf}
            onToggle={toggle}
            onPatch={isPatch ? setPatch : null}
          />
          <FieldNotes inputId="figure-memberHrs" problem={problem('memberHrs')} />
        </div>
        {!isPatch && members.length > 0 && (
          <ChosenStars
            stars={members}
            indicatorHr={draft.indicatorHr}
            nameOf={nameOf}
            problem={problem('indicatorHr')}
            onLead={(indicatorHr) => {
              change({ indicatorHr });
            }}
            onTakeOut={toggle}
          />
        )}
      </div>
    </Board>
  );
}

function patchOf(rightAscension: string, declination: string): SkyPoint | null {
  const [rightAscensionDeg, declinationDeg] = [
    readRightAscension(rightAscension),
    readDeclination(declination),
  ];
  return rightAscensionDeg === null || declinationDeg === null ? null : { rightAscensionDeg, declinationDeg };
}

function labelOf(name: string, designation: string): string {
  return name === designation || designation === '' ? name : `${name} (${designation})`;
}
