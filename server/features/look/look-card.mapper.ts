import { limitPoint, lookMarks } from '#shared/contracts/look-marks.js';
import type { Look, LookMoment } from '#shared/contracts/look.js';
import type { OccurrenceDays } from '#shared/contracts/stars.js';
import { eyeWay, halfHands, handsFigure } from '#shared/kernel/hands.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import type { WatchCardModel, WatchPicture } from '#shared/sheet/watch-card-model.js';
import { COMPASS_POINTS, compassPoint } from '#shared/sky/index.js';
import { translatorFor, type Translate } from '../../print/translator.js';

/** The texts of a card in one language. */
interface CardWords {
  look: Translate;
  sky: Translate;
  common: Translate;
  language: string;
}

/** Where to look on one day as everything that its printed card says. */
export function toWatchCard(look: Look, language: string): WatchCardModel {
  const words: CardWords = {
    look: translatorFor(language, 'look'),
    sky: translatorFor(language, 'sky'),
    common: translatorFor(language, 'common'),
    language,
  };
  const { look: t } = words;
  const { side, placeName, engineVersion } = look;
  return {
    title: t('card.title', { marker: nameOf(look) }),
    when: t(`under.${side}`, { place: placeName, day: dayWords(look.date, language, 'weekday') }),
    limit: limitOf(look, t),
    picture: pictureOf(look, words),
    sentences: sentencesOf(look, words),
    cautions: [t('care.eyes'), t('card.night')],
    foot: `${t('card.computed')} ${t('card.basis', { engineVersion })}`,
  };
}

/** `Pleiades`; a star without a name by its letter. */
export function nameOf({ marker: { name, designation, hr } }: Look): string {
  if (name !== '') return name;
  return designation === '' ? `HR ${hr}` : designation;
}

function limitOf({ side, limitAt, sunCourse }: Look, t: Translate): string {
  if (limitAt !== null) return t(side === 'dawn' ? 'card.stop' : 'card.start', { time: limitAt });
  return t(sunCourse === 'stays-down' ? 'card.noLimit' : 'card.noWatch');
}

/** The most needed first: what to do, what not to take for it, how to find it, then the rest. */
function sentencesOf(look: Look, words: CardWords): string[] {
  const { look: t } = words;
  const [firstPointer = [], ...otherPointers] = look.pointers.slice(0, 2).map((pointer) => [
    t('card.pointer', {
      name: pointer.name,
      compass: compassOf(pointer.azimuthDeg, words),
      hands: handsOf(pointer.separationDeg, t),
      way: t(`way.${eyeWay(pointer.bearingDeg)}`),
    }),
  ]);
  return [
    outcomeOf(look, words),
    look.seenFromAt === null || look.seenToAt === null
      ? ''
      : t('card.seen', { from: look.seenFromAt, to: look.seenToAt }),
    ...look.planets.map((planet) =>
      t(planet.isBrighter ? 'card.brighter' : 'card.like', {
        planet: t(`planet.${planet.planet}`),
        hands: handsOf(planet.separationDeg, t),
        way: t(`cardWay.${eyeWay(planet.bearingDeg)}`),
      }),
    ),
    ...firstPointer,
    moonOf(look, words),
    look.season.days === null
      ? ''
      : t('card.days', {
          phenomenon: words.sky(`phenomenonTitle.${look.phenomenon}`),
          about: aboutBetween(look.season.days, words),
        }),
    ...otherPointers.flat(),
    t('card.hand'),
  ].filter((sentence) => sentence !== '');
}

function outcomeOf(look: Look, words: CardWords): string {
  const { outcome, outcomeDetail, best } = look;
  const { look: t } = words;
  const marker = nameOf(look);
  if (outcome === 'never-clears-skyline') return t(`plain.${outcomeDetail ?? 'below-skyline'}`, { marker });
  if (best === null) return t(`plain.${outcome}`, { marker });
  const hands = halfHands(best.aboveSkylineDeg);
  return t(outcome === 'seen' && hands === 0 ? 'plain.seenOn' : `plain.${outcome}`, {
    marker,
    time: best.localTime,
    compass: compassOf(best.azimuthDeg, words),
    hands: handsOf(best.aboveSkylineDeg, t),
  });
}

function moonOf({ moon }: Look, words: CardWords): string {
  if (moon === null) return '';
  const { look: t } = words;
  const shape = t(`cardMoon.shape.${moon.shape}`);
  if (!moon.isUp) return t('card.moonDown', { shape });
  const light = t(`cardMoon.light.${moon.moonlight}`);
  return t('card.moonUp', { shape, compass: compassOf(moon.azimuthDeg, words), light }).trim();
}

function handsOf(angleDeg: number, t: Translate): string {
  const hands = halfHands(angleDeg);
  if (hands === 0) return t('hands.none');
  return hands === 0.5 ? t('hands.half') : t('hands.some', { count: hands, hands: handsFigure(hands) });
}

function compassOf(azimuthDeg: number, { sky }: CardWords): string {
  return sky(`compass.${compassPoint(azimuthDeg)}`);
}

function pictureOf(look: Look, { look: t, sky }: CardWords): WatchPicture | null {
  const { best, path, side } = look;
  if (best === null) return null;
  const limit = limitPoint(look);
  return {
    skyline: look.skyline,
    path: path.map((moment) => ({ ...placeOf(moment), isSeen: moment.isSeen, isUp: moment.isUp })),
    star: placeOf(best),
    stop: side === 'dawn' && limit !== null ? placeOf(limit) : null,
    labels: lookMarks(look).map(({ key, time, ...at }) => ({ ...at, words: t(`picture.${key}`, { time }) })),
    compass: COMPASS_POINTS.map((point, index) => ({
      azimuthDeg: (index * 360) / COMPASS_POINTS.length,
      words: sky(`compass.${point}`),
    })),
    handWords: t('handRod'),
  };
}

function placeOf({ azimuthDeg, altitudeDeg }: LookMoment): { azimuthDeg: number; altitudeDeg: number } {
  return { azimuthDeg, altitudeDeg };
}

function aboutBetween({ expected, early, late }: OccurrenceDays, { common, language }: CardWords): string {
  const day = dayWords(expected.gregorian, language, 'year');
  const from = early && dayWords(early.gregorian, language, 'day');
  const to = late && dayWords(late.gregorian, language, 'day');
  if (from !== null && to !== null) return common('date.within.aboutBetween', { day, from, to });
  if (to !== null) return common('date.within.aboutNotAfter', { day, to });
  if (from !== null) return common('date.within.aboutNotBefore', { day, from });
  return common('date.within.aboutOpen', { day });
}

const MS_PER_DAY = 86_400_000;
const UNIX_EPOCH_DAY_NUMBER = 2_440_588;

/** Day first, as the screens have it; a date never breaks. */
function dayWords(iso: string, language: string, form: 'weekday' | 'year' | 'day'): string {
  const instantMs = (dayNumberFromIso(iso) - UNIX_EPOCH_DAY_NUMBER) * MS_PER_DAY;
  const format = new Intl.DateTimeFormat(language === 'en' ? 'en-GB' : language, {
    timeZone: 'UTC',
    day: 'numeric',
    month: 'long',
    ...(form === 'day' ? {} : { year: 'numeric' }),
    ...(form === 'weekday' ? { weekday: 'long' } : {}),
  });
  return format
    .formatToParts(instantMs)
    .map(({ value }, index, parts) =>
      parts[index - 1]?.type === 'weekday' ? ' ' : value.replaceAll(' ', '\u00a0'),
    )
    .join('');
}
