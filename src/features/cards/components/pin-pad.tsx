import { Delete } from 'lucide-react';
import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { PIN_MAX } from '#shared/contracts/cards.js';
import { FieldFrame } from '#src/ui/field.js';

const DIGITS = ['1', '2', '3', '4', '5', '6', '7', '8', '9'] as const;

/** Large keys for thumbs, and a field that a keyboard types into. What is typed is never shown or read aloud. */
export function PinPad({
  value,
  problem,
  onChange,
}: {
  value: string;
  problem?: string | undefined;
  onChange: (pin: string) => void;
}) {
  const { t } = useTranslation('cards');
  const inputId = useId();
  const press = (digit: string) => {
    onChange((value + digit).slice(0, PIN_MAX));
  };
  return (
    <div className="grid gap-3">
      <FieldFrame inputId={inputId} label={t('door.pin')} problem={problem}>
        <input
          id={inputId}
          className="inp pin-field"
          type="password"
          // The keys below are the keyboard of a phone here.
          inputMode="none"
          autoComplete="off"
          maxLength={PIN_MAX}
          value={value}
          aria-invalid={problem !== undefined || undefined}
          onChange={(event) => {
            onChange(event.currentTarget.value.replace(/\D/gu, '').slice(0, PIN_MAX));
          }}
        />
      </FieldFrame>
      <p className="for-ears" role="status">
        {t('door.typed', { count: value.length })}
      </p>
      <div className="pin-pad" role="group" aria-label={t('door.pin')}>
        {DIGITS.map((digit) => (
          <Key key={digit} digit={digit} onPress={press} />
        ))}
        <button
          type="button"
          className="pin-key words"
          onClick={() => {
            onChange('');
          }}
        >
          {t('door.wipe')}
        </button>
        <Key digit="0" onPress={press} />
        <button
          type="button"
          className="pin-key"
          aria-label={t('door.back')}
          title={t('door.back')}
          onClick={() => {
            onChange(value.slice(0, -1));
          }}
        >
          <Delete aria-hidden size={28} className="turns" />
        </button>
      </div>
    </div>
  );
}

function Key({ digit, onPress }: { digit: string; onPress: (digit: string) => void }) {
  return (
    <button
      type="button"
      className="pin-key"
      onClick={() => {
        onPress(digit);
      }}
    >
      {digit}
    </button>
  );
}
