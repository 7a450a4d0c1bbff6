import { useState, type ComponentProps } from 'react';
import { Button } from '../ui/button.tsx';
import { TextField } from '../ui/field.tsx';

/** A password, with a button that shows what is typed. */
export function PasswordField(props: Omit<ComponentProps<typeof TextField>, 'label' | 'type' | 'after'>) {
  const [isShown, setShown] = useState(false);
  return (
    <TextField
      {...props}
      label="Password"
      type={isShown ? 'text' : 'password'}
      autoCapitalize="none"
      spellCheck={false}
      after={
        <Button
          kind="quiet"
          aria-pressed={isShown}
          aria-label="Show the password"
          onClick={() => setShown(!isShown)}
        >
          {isShown ? 'Hide' : 'Show'}
        </Button>
      }
    />
  );
}
