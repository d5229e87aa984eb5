import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { ANSWERS } from '#shared/contracts/reviews.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { layoutReadBack, type ReadBackModel } from '#shared/sheet/read-back.js';
import type { DataSource } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { fileNameOf } from '../../print/file-name.js';
import { fontMeasurer } from '../../print/font-measurer.js';
import { renderPages } from '../../print/render-pages.js';
import { sheetWords } from '../../print/sheet-words.js';
import { translatorFor } from '../../print/translator.js';
import { elderNamesOf } from '../people/elder-names.service.js';
import { civilDateAt } from '../places/place-day.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import { toSheetMarkers } from './sheet-markers.mapper.js';
import { whyNoDate } from './why-no-date.js';

/** A submission in short sentences, to be read to a meeting, with boxes for its elders: what the board would show. */
export class ReadBackService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly contents: FrozenContentService,
    private readonly clock: Clock,
  ) {}

  async pdf(
    actor: Actor,
    calendarId: string,
    number: number,
  ): Promise<{ content: Buffer; fileName: string }> {
    const read = await this.contents.readForBoard(actor, calendarId, String(number));
    const { header, entries, state, hash } = read;
    if (hash === null) throw notFound();
    if (state !== 'in-review') throw conflict('not-in-review');
    const t = translatorFor(DEFAULT_LANGUAGE, 'reviews');
    const about = { village: header.communityName, place: header.place.name, year: header.year, number };
    const model: ReadBackModel = {
      title: t('readBack.title', about),
      lead: t('readBack.lead'),
      entries: entries.map((entry) => toRead(entry, header)),
      answers: ANSWERS.map((answer) => t(`answer.${answer}`)) as [string, string, string, string],
      elders: await elderNamesOf(this.dataSource.manager, actor.communityId),
      lineForWords: t('readBack.words'),
      foot: [t('readBack.foot', about), t('readBack.hash', { hash })],
    };
    const content = await renderPages(layoutReadBack(model, fontMeasurer), {
      title: model.title,
      author: header.communityName,
      language: DEFAULT_LANGUAGE,
      printDate: civilDateAt(this.clock.now(), header.place),
    });
    return { content, fileName: fileNameOf(t('readBack.fileName', about), 'pdf') };
  }
}

/** When, by what, until when, and what to mind: one short sentence each. */
function toRead(entry: VersionEntryBody, header: VersionHeader): ReadBackModel['entries'][number] {
  const { content, dates } = entry;
  const { year, markers } = header;
  const t = translatorFor(DEFAULT_LANGUAGE, 'reviews');
  const texts = {
    files: translatorFor(DEFAULT_LANGUAGE, 'files'),
    sky: translatorFor(DEFAULT_LANGUAGE, 'sky'),
  };
  const words = sheetWords({
    translate: translatorFor(DEFAULT_LANGUAGE, 'print'),
    language: DEFAULT_LANGUAGE,
    year,
  });
  const { window } = dates;
  const [marker] = toSheetMarkers([entry], markers, year, texts);
  const sentences: string[] = [];
  if (window === null) {
    const because = whyNoDate(dates, year, texts);
    sentences.push(because === null ? t('noWindow') : `${t('noWindow')} ${because}.`);
  } else {
    sentences.push(t('readBack.best', { range: words.range(window.bestFrom, window.bestTo) }));
  }
  const expected = marker?.expected ?? null;
  if (marker && expected !== null) {
    const { early, late } = marker;
    const name = `${marker.titles.officer} (${marker.phenomenon})`;
    sentences.push(
      early === null || late === null
        ? t('readBack.about', { name, day: words.day(expected) })
        : t('readBack.between', {
            ...{ name, day: words.day(expected) },
            ...{ from: words.day(early), to: words.day(late) },
          }),
    );
  }
  if (content.lead.type === 'fixed-date') {
    sentences.push(
      t('fixed', { day: words.day(isoIn(year, content.lead.date)), source: content.lead.source }),
    );
  }
  if (window !== null) sentences.push(t('lastAdvised', { day: words.day(window.lastAdvised) }));
  if (content.protectiveWatch) sentences.push(t('watch'));
  if (content.otherSigns !== '') sentences.push(`${t('signs')}: ${content.otherSigns}`);
  if (content.ifLate !== '') sentences.push(`${t('ifLate')}: ${content.ifLate}`);
  if (content.caution !== '') sentences.push(content.caution);
  const { titleVillage, titleOfficer } = content;
  return { title: titleVillage === '' ? titleOfficer : `${titleVillage} · ${titleOfficer}`, sentences };
}

function isoIn(year: number, { month, day }: { month: number; day: number }): string {
  const two = (part: number) => String(part).padStart(2, '0');
  return `${String(year).padStart(4, '0')}-${two(month)}-${two(day)}`;
}
