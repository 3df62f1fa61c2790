import { DropdownMenu } from 'radix-ui';
import type { ReactElement, ReactNode } from 'react';

interface MenuProps {
  /** The button that opens it. */
  readonly trigger: ReactElement;
  readonly children: ReactNode;
  readonly align?: 'start' | 'end';
}

/** A short list of actions that opens from a button. Not modal: Radix's scroll lock writes a style tag, which the policy refuses. */
export function Menu({ trigger, children, align = 'start' }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      {/* Without a portal, so that the list stays inside the landmark that its button is in. */}
      <DropdownMenu.Content className="menu" align={align} sideOffset={4} collisionPadding={8}>
        {children}
      </DropdownMenu.Content>
    </DropdownMenu.Root>
  );
}

interface MenuItemProps {
  readonly onSelect: () => void;
  readonly disabled?: boolean;
  readonly children: ReactNode;
}

export function MenuItem({ onSelect, disabled = false, children }: MenuItemProps) {
  return (
    <DropdownMenu.Item onSelect={onSelect} disabled={disabled}>
      {children}
    </DropdownMenu.Item>
  );
}

export const MenuRule = () => <DropdownMenu.Separator className="my-1 h-px bg-rule" />;
