import { TickField } from '#src/ui/field.js';

/** Some of several, each its own tick. */
export function TickSet<T extends string>({
  label,
  hint,
  values,
  words,
  chosen,
  onChange,
}: {
  label: string;
  hint?: string | undefined;
  values: readonly T[];
  words: (value: T) => string;
  chosen: readonly T[];
  onChange: (chosen: T[]) => void;
}) {
  return (
    <fieldset>
      <legend className="field-label">{label}</legend>
      {hint !== undefined && <p className="text-small text-umber-soft">{hint}</p>}
      {values.map((value) => (
        <TickField
          key={value}
          label={words(value)}
          checked={chosen.includes(value)}
          onChange={(event) => {
            const others = chosen.filter((one) => one !== value);
            onChange(event.currentTarget.checked ? [...others, value] : others);
          }}
        />
      ))}
    </fieldset>
  );
}
