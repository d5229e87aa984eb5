import { FileUp } from 'lucide-react';
import { useMemo, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { TextAreaField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { readSkylineText } from '../model/skyline-text.js';
import type { FieldPart } from './place-form-parts.js';
import { usePlaceProblemWords } from './place-problem-words.js';

/** A table of 361 lines has a few thousand letters; what is far larger is another file. */
const FILE_MAX_BYTES = 200_000;
const LINES_SAID = 8;

/** The skyline as a pasted table or a CSV file. Each wrong line is named; nothing counts until all are right. */
export function SkylineTableEditor({ draft, change, text }: FieldPart & { text: string }) {
  const { t } = useTranslation('places');
  const words = usePlaceProblemWords();
  const say = useToast();
  const file = useRef<HTMLInputElement>(null);
  const [fileTrouble, setFileTrouble] = useState<string | null>(null);
  const reading = useMemo(() => readSkylineText(text), [text]);
  const problems = reading.ok ? [] : reading.problems;

  const load = async (chosen: File) => {
    setFileTrouble(null);
    if (chosen.size > FILE_MAX_BYTES) {
      setFileTrouble(t('skyline.loadTooLarge'));
      return;
    }
    const content = await chosen.text().catch(() => null);
    // A workbook or a picture read as text is full of zeros and unknown letters.
    if (content === null || /[\u0000\ufffd]/u.test(content)) setFileTrouble(t('skyline.loadFailed'));
    else change({ skylineText: content });
  };
  const leave = () => {
    const left = draft.skylineText;
    change({ skylineText: null });
    say(t('skyline.tableLeft'), {
      onUndo: () => {
        change({ skylineText: left });
      },
    });
  };
  return (
    <div className="grid content-start gap-3">
      <TextAreaField
        id="place-skyline"
        label={t('skyline.pasteLabel')}
        hint={t('skyline.pasteHint')}
        value={text}
        rows={8}
        dir="ltr"
        spellCheck={false}
        autoComplete="off"
        onChange={(event) => {
          change({ skylineText: event.currentTarget.value });
        }}
        problem={
          problems.length === 0 ? undefined : (
            <>
              {problems.slice(0, LINES_SAID).map((problem) => (
                <span key={`${problem.line} ${problem.code}`} className="block">
                  {words.line(problem)}
                </span>
              ))}
              {problems.length > LINES_SAID && (
                <span className="block">
                  {t('skyline.moreLines', { count: problems.length - LINES_SAID })}
                </span>
              )}
              <span className="block">{t('skyline.nothingSaved')}</span>
            </>
          )
        }
      />
      {reading.ok && (
        <p className="text-small text-moss" aria-live="polite">
          {reading.points.length === 0
            ? t('skyline.tableEmpty')
            : t('skyline.tableRight', { count: reading.points.length })}
        </p>
      )}
      {fileTrouble !== null && (
        <Care blocked role="alert">
          <p>{fileTrouble}</p>
        </Care>
      )}
      <div className="flex flex-wrap gap-2">
        <Button
          closedBecause={reading.ok ? undefined : t('skyline.useTableBecause')}
          onClick={() => {
            if (!reading.ok) return;
            change({ skyline: reading.points, skylineText: null });
            say(t('skyline.tableUsed', { count: reading.points.length }));
          }}
        >
          {t('skyline.useTable')}
        </Button>
        <Button icon={<FileUp aria-hidden size={20} />} onClick={() => file.current?.click()}>
          {t('skyline.load')}
        </Button>
        <Button look="quiet" onClick={leave}>
          {t('skyline.leaveTable')}
        </Button>
        <input
          ref={file}
          type="file"
          hidden
          aria-label={t('skyline.load')}
          accept=".csv,.txt,.tsv,text/csv,text/plain"
          onChange={(event) => {
            const [chosen] = event.currentTarget.files ?? [];
            event.currentTarget.value = '';
            if (chosen) void load(chosen);
          }}
        />
      </div>
    </div>
  );
}
