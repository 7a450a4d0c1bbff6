import { useState, type ComponentProps } from 'react';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';

type PasswordFieldProps = Omit<ComponentProps<typeof TextField>, 'label' | 'type' | 'after'> & {
  label?: string;
};

/** A password, with a button that shows what is typed. */
export function PasswordField({ label = 'Password', ...props }: PasswordFieldProps) {
  const [isShown, setShown] = useState(false);
  return (
    <TextField
      {...props}
      label={label}
      type={isShown ? 'text' : 'password'}
      autoCapitalize="none"
      spellCheck={false}
      after={
        <Button
          kind="quiet"
          aria-pressed={isShown}
          aria-label={`Show the ${label.toLowerCase()}`}
          onClick={() => setShown(!isShown)}
        >
          {isShown ? 'Hide' : 'Show'}
        </Button>
      }
    />
  );
}
