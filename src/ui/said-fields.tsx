import { SelectField, TextAreaField, TextField } from './field.js';

interface WordsProps {
  label: string;
  hint?: string | undefined;
  value: string;
  problem?: string | undefined;
  onChange: (value: string) => void;
}

/** One line that is said. */
export function LineField({ onChange, ...field }: WordsProps) {
  return (
    <TextField
      {...field}
      onChange={(event) => {
        onChange(event.currentTarget.value);
      }}
    />
  );
}

export function AreaField({ onChange, ...field }: WordsProps) {
  return (
    <TextAreaField
      {...field}
      rows={2}
      onChange={(event) => {
        onChange(event.currentTarget.value);
      }}
    />
  );
}

interface CountProps extends Omit<WordsProps, 'value' | 'onChange'> {
  value: number | null;
  onChange: (value: number | null) => void;
}

/** A number that may stay unsaid. */
export function CountField({ value, onChange, ...field }: CountProps) {
  return (
    <TextField
      {...field}
      type="number"
      inputMode="numeric"
      min={0}
      value={value ?? ''}
      onChange={(event) => {
        const typed = event.currentTarget.valueAsNumber;
        onChange(Number.isNaN(typed) ? null : typed);
      }}
    />
  );
}

interface ChoiceProps<T extends string> {
  label: string;
  value: T | null;
  options: readonly T[];
  words: (option: T) => string;
  /** What stands there while nothing is chosen. */
  nothing: string;
  problem?: string | undefined;
  onChange: (value: T | null) => void;
}

/** One of a list, or nothing said. */
export function ChoiceField<T extends string>(props: ChoiceProps<T>) {
  const { label, value, options, words, nothing, problem, onChange } = props;
  return (
    <SelectField
      label={label}
      value={value ?? ''}
      problem={problem}
      onChange={(event) => {
        onChange(options.find((option) => option === event.currentTarget.value) ?? null);
      }}
    >
      <option value="">{nothing}</option>
      {options.map((option) => (
        <option key={option} value={option}>
          {words(option)}
        </option>
      ))}
    </SelectField>
  );
}
