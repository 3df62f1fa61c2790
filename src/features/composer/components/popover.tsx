import { Popover as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

interface PopoverProps {
  readonly label: ReactNode;
  /** Said of the button and of the sheet; needed where the label is only a picture. */
  readonly name?: string;
  readonly children: ReactNode;
  readonly disabled?: boolean;
  readonly title?: string;
  readonly align?: 'start' | 'center' | 'end';
}

/** A small sheet that opens from one of the mat actions. */
export function ActionPopover({ label, name, children, disabled = false, title, align = 'start' }: PopoverProps) {
  return (
    <Radix.Root>
      <Radix.Trigger asChild>
        <button type="button" className="mat-action" aria-label={name} disabled={disabled} title={title}>
          {label}
        </button>
      </Radix.Trigger>
      <Radix.Portal>
        <Radix.Content className="action-sheet" aria-label={name ?? (typeof label === 'string' ? label : undefined)} align={align} sideOffset={6} collisionPadding={12}>
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
