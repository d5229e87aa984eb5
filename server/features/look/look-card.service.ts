import type { LookQuery } from '#shared/contracts/look.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { layoutWatchCard } from '#shared/sheet/watch-card.js';
import type { Actor } from '../../http/actor.js';
import { fileNameOf } from '../../print/file-name.js';
import { fontMeasurer } from '../../print/font-measurer.js';
import { renderPages } from '../../print/render-pages.js';
import { translatorFor } from '../../print/translator.js';
import { nameOf, toWatchCard } from './look-card.mapper.js';
import type { LookService } from './look.service.js';

/** The watch card: one page of A5 to take along before dawn. */
export class LookCardService {
  constructor(private readonly looks: LookService) {}

  async pdf(actor: Actor, placeId: string, query: LookQuery): Promise<{ content: Buffer; fileName: string }> {
    const look = await this.looks.read(actor, placeId, query);
    const model = toWatchCard(look, DEFAULT_LANGUAGE);
    const content = await renderPages([layoutWatchCard(model, fontMeasurer)], {
      title: `${model.title}: ${model.when}`,
      author: look.placeName,
      language: DEFAULT_LANGUAGE,
      printDate: look.date,
    });
    const t = translatorFor(DEFAULT_LANGUAGE, 'look');
    const name = t('card.fileName', { place: look.placeName, date: look.date, marker: nameOf(look) });
    return { content, fileName: fileNameOf(name, 'pdf') };
  }
}
