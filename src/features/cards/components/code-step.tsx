import { ArrowRight } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { cardCode } from '#shared/contracts/cards.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { CardScan } from './card-scan.js';

/** Scan the squares where the browser can, or type the letters. */
export function CodeStep({
  busy,
  problem,
  onCode,
}: {
  busy: boolean;
  problem: string | undefined;
  onCode: (code: string) => void;
}) {
  const { t } = useTranslation('cards');
  const words = useProblemWords();
  const [code, setCode] = useState('');
  const [isShort, setIsShort] = useState(false);
  return (
    <div className="grid gap-4">
      <CardScan onFound={onCode} />
      <form
        noValidate
        className="grid gap-4"
        onSubmit={(event) => {
          event.preventDefault();
          const isWhole = cardCode.safeParse(code).success;
          setIsShort(!isWhole);
          if (isWhole) onCode(code);
        }}
      >
        <TextField
          label={t('door.code')}
          hint={t('door.codeHint')}
          value={code}
          problem={isShort ? words.field('card-code-length') : problem}
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          onChange={(event) => {
            setCode(event.currentTarget.value);
            setIsShort(false);
          }}
        />
        <Button
          type="submit"
          look="main"
          full
          busy={busy}
          icon={<ArrowRight aria-hidden className="turns" size={22} />}
        >
          {t('door.next')}
        </Button>
      </form>
    </div>
  );
}
