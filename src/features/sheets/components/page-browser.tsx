import { ArrowLeft, ArrowRight } from 'lucide-react';
import { useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { SheetPage } from '#shared/sheet/primitives.js';
import { Button, IconButton } from '#src/ui/button.js';
import { classNames } from '#src/ui/class-names.js';
import { More } from '#src/ui/fold.js';
import { PageSvg } from './page-svg.js';

/** All pages small, one of them large, at true proportions; its words as a list behind it. */
export function PageBrowser({ pages }: { pages: readonly SheetPage[] }) {
  const { t } = useTranslation('sheets');
  const [wanted, setWanted] = useState(0);
  const [realSize, setRealSize] = useState(false);
  const index = Math.min(wanted, pages.length - 1);
  const page = pages[index];
  const strip = useRef<HTMLOListElement>(null);
  useEffect(() => {
    // Only the strip scrolls: the page a person reads must not jump.
    const button = strip.current?.children[index];
    if (strip.current && button instanceof HTMLElement) {
      strip.current.scrollTo({ left: button.offsetLeft - strip.current.clientWidth / 2 });
    }
  }, [index]);
  if (!page) return null;
  const nameOf = (each: SheetPage) => t(`pageTitle.${each.kind}`, { name: each.name });
  const go = (next: number) => {
    if (next >= 0 && next < pages.length) setWanted(next);
  };

  return (
    <div className="sheet-browser">
      <ol ref={strip} className="sheet-strip" aria-label={t('pages')}>
        {pages.map((each, at) => (
          <li key={at}>
            <button
              type="button"
              aria-current={at === index ? 'page' : undefined}
              onClick={() => {
                go(at);
              }}
            >
              <PageSvg page={each} label="" />
              <span>{nameOf(each)}</span>
            </button>
          </li>
        ))}
      </ol>
      <div className={classNames('sheet-page', realSize && 'real-size')}>
        <PageSvg page={page} label={t('pagePicture', { page: index + 1, name: nameOf(page) })} />
      </div>
      <div className="flex flex-wrap items-center gap-2">
        <IconButton
          label={t('before')}
          icon={<ArrowLeft aria-hidden size={22} className="turns" />}
          closed={index === 0}
          onClick={() => {
            go(index - 1);
          }}
        />
        <IconButton
          label={t('next')}
          icon={<ArrowRight aria-hidden size={22} className="turns" />}
          closed={index === pages.length - 1}
          onClick={() => {
            go(index + 1);
          }}
        />
        <span aria-live="polite">{t('pageOf', { page: index + 1, total: pages.length })}</span>
        <Button
          look="quiet"
          onClick={() => {
            setRealSize((before) => !before);
          }}
        >
          {realSize ? t('fitSize') : t('realSize')}
        </Button>
      </div>
      <More label={t('words')}>
        <ul className="mt-2 grid gap-1">
          {wordsOf(page).map((words, at) => (
            <li key={at}>{words}</li>
          ))}
        </ul>
      </More>
    </div>
  );
}

/** Words of a page from top to bottom; day numbers and single letters are left to the picture. */
function wordsOf(page: SheetPage): string[] {
  return page.primitives
    .flatMap((primitive) => (primitive.type === 'text' ? [primitive] : []))
    .map((text) => ({ top: text.box.y, words: text.lines.map((line) => line.text.trim()).join(' ') }))
    .filter(({ words }) => words.length > 3)
    .sort((a, b) => a.top - b.top)
    .map(({ words }) => words);
}
