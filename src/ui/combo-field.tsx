import { ChevronDown, TriangleAlert } from 'lucide-react';
import type { ReactNode } from 'react';
import {
  Button,
  ComboBox,
  Input,
  Label,
  ListBox,
  ListBoxItem,
  Popover,
  type Key,
} from 'react-aria-components';
import { useTranslation } from 'react-i18next';

export interface ComboOption {
  id: string;
  /** What is typed to find it, and what stands in the field once chosen. */
  text: string;
  /** How it looks in the list; `text` without it. */
  look?: ReactNode;
}

export interface ComboFieldProps {
  label: ReactNode;
  options: readonly ComboOption[];
  value: string | null;
  onChange: (id: string | null) => void;
  hint?: ReactNode;
  problem?: ReactNode;
  /** How a typed text finds an option; the default looks for it anywhere, whatever the capitals and marks. */
  fits?: ((text: string, typed: string) => boolean) | undefined;
  className?: string | undefined;
}

/** One of many, found by typing: a star among hundreds. */
export function ComboField(props: ComboFieldProps) {
  const { label, options, value, onChange, hint, problem, fits = textFits, className } = props;
  const { t } = useTranslation('common');
  return (
    <ComboBox
      className={`field ${className ?? ''}`}
      defaultItems={options}
      value={value}
      onChange={(key: Key | null) => {
        onChange(key === null ? null : String(key));
      }}
      defaultFilter={fits}
      isInvalid={problem !== undefined}
      menuTrigger="focus"
      allowsEmptyCollection
    >
      <Label className="field-label">{label}</Label>
      <div className="inp-holder ends">
        <Input className="inp" />
        <Button className="inp-key" aria-label={t('suggestionsOpen')}>
          <ChevronDown aria-hidden size={22} />
        </Button>
      </div>
      {hint !== undefined && (
        <span className="field-hint" slot="description">
          {hint}
        </span>
      )}
      {problem !== undefined && (
        <span className="field-said">
          <TriangleAlert aria-hidden size={20} />
          <span>{problem}</span>
        </span>
      )}
      <Popover className="suggestions">
        <ListBox<ComboOption> renderEmptyState={() => <p className="p-3">{t('noMatch')}</p>}>
          {(option) => (
            <ListBoxItem className="suggestion" id={option.id} textValue={option.text}>
              <span className="ring" aria-hidden />
              {option.look ?? option.text}
            </ListBoxItem>
          )}
        </ListBox>
      </Popover>
    </ComboBox>
  );
}

/** Marks and capitals do not matter while searching. */
export function textFits(text: string, typed: string): boolean {
  return plain(text).includes(plain(typed));
}

function plain(text: string): string {
  return text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase().trim();
}
