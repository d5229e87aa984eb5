import { ArrowDown, ArrowUp } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ListedWord } from '#shared/contracts/word-lists.js';
import { useCropDays } from '#src/lib/crop-days.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSaveWords } from '#src/lib/word-lists.js';
import { Button, IconButton } from '#src/ui/button.js';
import { Chip } from '#src/ui/chip.js';
import { useToast } from '#src/ui/toast.js';
import type { OneListProps } from '../model/one-list.js';
import { useUsualName } from '../model/usual-names.js';
import { withMoved } from '../model/word-changes.js';

interface WordRowsProps extends OneListProps {
  onChange: (word: ListedWord) => void;
}

/** The words in their order, each with what it means and ways to change and to move it. */
export function WordRows({ communityId, list, stored, mayWrite, onChange }: WordRowsProps) {
  const { t } = useTranslation('words');
  const usual = useUsualName(list);
  const say = useToast();
  const words = useProblemWords();
  const { save } = useSaveWords(communityId, list);
  const [said, setSaid] = useState('');
  const { items, version } = stored;
  const named = ({ word, like }: ListedWord) => (word === '' ? usual(like) : word);
  const move = async (item: ListedWord, from: number, to: number) => {
    try {
      await save.mutateAsync({ version, items: withMoved(items, from, to) });
      setSaid(t('moved', { name: named(item), place: to + 1, count: items.length }));
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  return (
    <>
      <p className="for-ears" role="status">
        {said}
      </p>
      <ol>
        {items.map((item, index) => (
          <li
            key={item.key}
            className="flex flex-wrap items-center justify-between gap-x-3 gap-y-1 border-b border-hairline py-2"
          >
            <span className="min-w-0 flex-1 basis-48">
              <span className={item.word === '' ? undefined : 'own-words'}>{named(item)}</span>{' '}
              {item.isHidden && <Chip>{t('row.hidden')}</Chip>}
              <WordNotes item={item} usual={usual} />
            </span>
            {mayWrite && (
              <span className="flex items-center gap-1">
                <Button
                  look="quiet"
                  aria-label={t('changeAbout', { name: named(item) })}
                  onClick={() => {
                    onChange(item);
                  }}
                >
                  {t('change')}
                </Button>
                <IconButton
                  label={t('up', { name: named(item) })}
                  icon={<ArrowUp aria-hidden size={20} />}
                  closed={index === 0 || save.isPending}
                  onClick={() => void move(item, index, index - 1)}
                />
                <IconButton
                  label={t('down', { name: named(item) })}
                  icon={<ArrowDown aria-hidden size={20} />}
                  closed={index === items.length - 1 || save.isPending}
                  onClick={() => void move(item, index, index + 1)}
                />
              </span>
            )}
          </li>
        ))}
      </ol>
    </>
  );
}

interface WordNotesProps {
  item: ListedWord;
  usual: (code: ListedWord['like']) => string;
}

/** Under a word: its usual name, or what it behaves like, or how long a crop takes. */
function WordNotes({ item, usual }: WordNotesProps) {
  const { t } = useTranslation('words');
  const { key, like, word } = item;
  const length = useCropDays()(item);
  const notes = [
    ...(key === like ? (word === '' ? [] : [t('row.usual', { name: usual(like) })]) : []),
    ...(key !== like && like !== null ? [t('row.own'), t('row.like', { name: usual(like) })] : []),
    ...(length === '' ? [] : [length]),
  ];
  if (notes.length === 0) return null;
  return <span className="block text-small text-umber-soft">{notes.join(' · ')}</span>;
}
