import { Eye, EyeOff } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { TextField, type TextFieldProps } from '#src/ui/field.js';

/** A password that can be looked at: on a small keyboard nobody types a sentence blind. */
export function PasswordField(props: Omit<TextFieldProps, 'type' | 'endKey'>) {
  const { t } = useTranslation('session');
  const [shown, setShown] = useState(false);
  const Icon = shown ? EyeOff : Eye;
  const label = t(shown ? 'hidePassword' : 'showPassword');
  return (
    <TextField
      {...props}
      type={shown ? 'text' : 'password'}
      autoCapitalize="none"
      spellCheck={false}
      endKey={
        <button
          type="button"
          className="inp-key"
          aria-label={label}
          title={label}
          onClick={() => {
            setShown(!shown);
          }}
        >
          <Icon aria-hidden size={22} />
        </button>
      }
    />
  );
}
