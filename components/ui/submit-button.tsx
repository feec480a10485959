'use client';

import { useFormStatus } from 'react-dom';
import { Button, type ButtonProps } from './button';

/** The button that sends its form; it shows that the form is on its way. Must stand inside the `<form>`. */
export function SubmitButton({ look = 'primary', ...rest }: Omit<ButtonProps, 'type' | 'pending'>) {
  const { pending } = useFormStatus();
  return <Button {...rest} look={look} type="submit" pending={pending} />;
}
