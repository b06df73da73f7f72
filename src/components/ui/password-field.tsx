import { useState } from 'react';
import { Button } from './button.tsx';
import { Field, type FieldProps } from './field.tsx';

/** A password, hidden unless the person wants to see what they type. */
export function PasswordField({ action, ...field }: Omit<FieldProps, 'type' | 'unit'>) {
  const [isShown, setShown] = useState(false);
  return (
    <Field
      {...field}
      type={isShown ? 'text' : 'password'}
      autoCapitalize="none"
      spellCheck={false}
      action={
        <>
          {action}
          <Button
            kind="quiet"
            aria-label={isShown ? 'Hide the password' : 'Show the password'}
            onClick={() => {
              setShown(!isShown);
            }}
          >
            {isShown ? 'Hide' : 'Show'}
          </Button>
        </>
      }
    />
  );
}
