import { useTranslation } from 'react-i18next';
import type { MarkerDetail } from '#shared/contracts/stars.js';
import { CLARITIES } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import { paths } from '#src/lib/paths.js';
import { ButtonLink } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { monthsByClarity } from '../model/clarity-months.js';
import type { StarDates } from './star-dates.js';

/** What the dates rest on: never a date without it. */
export function BasisBoard({
  star,
  dates,
  placeId,
}: {
  star: MarkerDetail;
  dates: StarDates;
  placeId: string;
}) {
  const { t, i18n } = useTranslation(['stars', 'sky']);
  const words = useDateWords();
  const { basis } = star;
  const number = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 2, signDisplay: 'negative' });
  const shift = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 2, signDisplay: 'exceptZero' });
  const monthNames = words.months(2027).map((month) => month.long);
  const byClarity = monthsByClarity(basis.clarityByMonth);
  const hasShifts = basis.sameSideShiftDeg !== 0 || basis.oppositeSideShiftDeg !== 0;
  return (
    <Board title={t('star.basis')}>
      <dl className="facts">
        <Fact name={t('star.basisRule')}>{t(`star.basisRuleSet.${basis.thresholdSet}`)}</Fact>
        <Fact name={t('star.basisDepth')}>
          {t('star.basisDepthBoth', {
            same: number.format(basis.sameSideDeg),
            opposite: number.format(basis.oppositeSideDeg),
          })}
        </Fact>
        <Fact name={t('star.basisShifts')}>
          {hasShifts
            ? t('star.basisShiftsBoth', {
                same: shift.format(basis.sameSideShiftDeg),
                opposite: shift.format(basis.oppositeSideShiftDeg),
              })
            : t('star.basisNoShifts')}
        </Fact>
        <Fact name={t('star.basisSource')}>{basis.thresholdSource}</Fact>
        <Fact name={t('star.basisAir')}>
          {CLARITIES.filter((clarity) => byClarity[clarity].length > 0).map((clarity) => (
            <span key={clarity} className="block">
              {byClarity[clarity].length === 12
                ? t('star.basisAirAllYear', { clarity: t(`sky:clarity.${clarity}`) })
                : t('star.basisAirMonths', {
                    clarity: t(`sky:clarity.${clarity}`),
                    months: listWords(
                      byClarity[clarity].map((month) => monthNames[month] ?? ''),
                      i18n.language,
                    ),
                  })}
            </span>
          ))}
        </Fact>
        <Fact name={t('star.basisSkyline')}>
          {star.skyline.length === 0
            ? t('star.basisSkylineFlat')
            : t(`star.basisSkylineRule.${basis.skylineRule}`)}
        </Fact>
        <Fact name={t('star.basisEpoch')}>{dates.year}</Fact>
        {star.members.length > 0 && (
          <Fact name={t('star.basisMembers')}>
            {listWords(
              star.members.map((member) => member.name),
              i18n.language,
            )}
            <span className="range-line">{t('star.basisIndicator')}</span>
          </Fact>
        )}
        <Fact name={t('star.basisEngine')}>
          {t('star.basisEngineVersion', { version: basis.engineVersion })}
        </Fact>
      </dl>
      <p className="mt-3 text-small text-umber-soft">
        {t('star.basisRange')} {t('star.basisCare')}
      </p>
      <ButtonLink look="quiet" className="-ms-2 mt-1" to={paths.place(placeId)}>
        {t('star.place')}
      </ButtonLink>
    </Board>
  );
}

function Fact({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <div className="contents">
      <dt>{name}</dt>
      <dd>{children}</dd>
    </div>
  );
}
