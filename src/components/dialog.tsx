import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { IconButton } from './button';
import { CloseIcon } from './icons';

interface DialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: string;
  /** One or two sentences under the title. */
  readonly description?: ReactNode;
  readonly children: ReactNode;
  readonly className?: string;
}

/**
 * A sheet of paper over the table that asks one thing. The veil is a plain element, not Radix's Overlay:
 * that one writes a style tag, which the content security policy refuses.
 */
export function Dialog({ open, onClose, title, description, children, className = '' }: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={(isOpen) => !isOpen && onClose()}>
      <Radix.Portal>
        <div className="sheet-veil" aria-hidden="true" />
        <Radix.Content className={`sheet-dialog ${className}`} {...(description === undefined && { 'aria-describedby': undefined })}>
          <div className="flex items-start justify-between gap-4">
            <Radix.Title className="text-24">{title}</Radix.Title>
            <Radix.Close asChild>
              <IconButton label="Close" className="-mt-1 -mr-2">
                <CloseIcon />
              </IconButton>
            </Radix.Close>
          </div>
          {description !== undefined && <Radix.Description className="mt-2 text-ink-2">{description}</Radix.Description>}
          <div className="mt-4">{children}</div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
