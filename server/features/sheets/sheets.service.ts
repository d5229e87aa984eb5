import type { SheetPreview, SheetQuery } from '#shared/contracts/sheets.js';
import type { Signature, VersionEntryBody } from '#shared/contracts/versions.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import type { SheetModel } from '#shared/sheet/sheet-model.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { fileNameOf } from '../../print/file-name.js';
import { layoutSheetForServer, pdfAbout, unprintableLetters } from '../../print/sheet-pdf.js';
import { renderPages } from '../../print/render-pages.js';
import { translatorFor } from '../../print/translator.js';
import { civilDateAt } from '../places/place-day.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import type { VersionsService } from '../versions/versions.service.js';
import type { WeatherService } from '../weather/weather.service.js';
import type { SheetBefore } from './sheet-changes.mapper.js';
import { toSheetModel } from './sheet-model.mapper.js';

/** The peg sheet of whatever version the person may see; anything that is not published carries its state across. */
export class SheetsService {
  constructor(
    private readonly contents: FrozenContentService,
    private readonly versions: VersionsService,
    private readonly weather: WeatherService,
    private readonly clock: Clock,
  ) {}

  async pdf(
    actor: Actor,
    calendarId: string,
    number: string,
    query: SheetQuery,
  ): Promise<{ content: Buffer; fileName: string }> {
    const model = await this.model(actor, calendarId, number, query);
    const content = await renderPages(layoutSheetForServer(model), pdfAbout(model));
    return { content, fileName: sheetFileName(model) };
  }

  /** The same pages for the screen, with the size of the file and the letters that no typeface of ours has. */
  async preview(actor: Actor, calendarId: string, number: string, query: SheetQuery): Promise<SheetPreview> {
    const model = await this.model(actor, calendarId, number, query);
    const pages = layoutSheetForServer(model);
    return {
      layout: model.layout,
      paper: model.paper,
      label: model.label,
      fileBytes: (await renderPages(pages, pdfAbout(model))).length,
      missingLetters: unprintableLetters(pages),
      pages: pages.map((page) => ({ ...page })),
    };
  }

  private async model(
    actor: Actor,
    calendarId: string,
    number: string,
    query: SheetQuery,
  ): Promise<SheetModel> {
    const { header, entries, state, label } = await this.contents.readForBoard(actor, calendarId, number);
    const signatures =
      number === 'draft' ? [] : (await this.versions.read(actor, calendarId, Number(number))).signatures;
    const printDate = civilDateAt(this.clock.now(), header.place);
    return toSheetModel(
      {
        header,
        entries,
        state,
        label,
        signerNames: signerNames(signatures),
        printDate,
        notices: await this.weather.noticesOn(actor.communityId, printDate),
        before: label === null ? undefined : await this.before(actor, calendarId, Number(number), entries),
      },
      query,
    );
  }

  /**
   * The board that hung before, as far as it may still be printed. What stands in this version, too, but may not be
   * printed of it was not taken off: the board keeps silent about it.
   */
  private async before(
    actor: Actor,
    calendarId: string,
    number: number,
    printed: readonly VersionEntryBody[],
  ): Promise<SheetBefore | undefined> {
    const versions = await this.versions.list(actor, calendarId);
    const older = versions.find((version) => version.label !== null && version.number < number);
    if (older === undefined || older.label === null) return undefined;
    const { entries } = await this.contents.readForBoard(actor, calendarId, String(older.number));
    const held = await this.contents.idsIn(actor, calendarId, number);
    for (const { entryId } of printed) held.delete(entryId);
    return { label: older.label, entries: entries.filter(({ entryId }) => !held.has(entryId)) };
  }
}

/** Elders by name, then the steward: the same order on every print. */
function signerNames(signatures: readonly Signature[]): string[] {
  const namesOf = (role: Signature['role']) =>
    signatures
      .filter((signature) => signature.role === role)
      .map(({ displayName }) => displayName)
      .sort();
  return [...namesOf('elder'), ...namesOf('steward')];
}

/** `Upper Tazimel 2027-1 month cards.pdf` */
function sheetFileName(model: SheetModel): string {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const issue = model.label ?? `${model.year} ${model.stateWatermark ?? ''}`;
  const name = t(`sheet.fileName.${model.layout}`, { community: model.communityName, issue });
  return fileNameOf(name, 'pdf');
}
