'use client';
import type { ReactNode } from 'react';
import { useFormStatus } from 'react-dom';
import { Button, type ButtonKind } from '@/components/ui/button';

interface SubmitButtonProps {
  children: ReactNode;
  /** Said while the form is on its way. */
  pending?: string;
  kind?: ButtonKind;
  size?: 'normal' | 'small';
}

/** Sends its form, once at a time. */
export function SubmitButton({ children, pending = 'One moment …', kind = 'main', size }: SubmitButtonProps) {
  const status = useFormStatus();
  return (
    <Button type="submit" kind={kind} size={size} busy={status.pending} className="whitespace-nowrap">
      {status.pending ? pending : <span>{children}</span>}
    </Button>
  );
}
