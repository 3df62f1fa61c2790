import type { ComponentProps } from 'react';

export type ButtonVariant = 'plain' | 'ink' | 'paper' | 'bare';

interface ButtonProps extends ComponentProps<'button'> {
  readonly variant?: ButtonVariant;
  readonly size?: 'normal' | 'big';
  /** What it does is under way: the label stays, a line runs along the foot, further presses do nothing. */
  readonly working?: boolean;
}

/** A button. When disabled, say why in `title`. */
export function Button({
  variant = 'plain',
  size = 'normal',
  working = false,
  className = '',
  type = 'button',
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={working ? 'button' : type}
      className={`btn ${className}`}
      data-variant={variant}
      data-size={size}
      aria-busy={working || undefined}
      onClick={working ? undefined : onClick}
    />
  );
}

interface IconButtonProps extends Omit<ComponentProps<'button'>, 'aria-label'> {
  readonly label: string;
}

/** A button that shows only an icon; `label` is its name and its tooltip. */
export function IconButton({ label, className = '', type = 'button', title, ...rest }: IconButtonProps) {
  return <button {...rest} type={type} className={`btn ${className}`} data-variant="icon" aria-label={label} title={title ?? label} />;
}
