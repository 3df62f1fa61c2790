import type { ReactNode } from 'react';

interface IconProps {
  readonly className?: string;
}

function Icon({ children, className = '' }: IconProps & { readonly children: ReactNode }) {
  return (
    <svg className={`icon ${className}`} viewBox="0 0 20 20" aria-hidden="true" focusable="false">
      {children}
    </svg>
  );
}

/** Our own drawings, 20 px on a 1.5 px line. All are decoration: the word stands beside them or in a label. */
export const UndoIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M4 8h8a4 4 0 0 1 0 8H8" />
    <path d="M7 4.5 3.5 8 7 11.5" />
  </Icon>
);
export const RedoIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M16 8H8a4 4 0 0 0 0 8h4" />
    <path d="M13 4.5 16.5 8 13 11.5" />
  </Icon>
);
export const UpDownIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M6 8l4-4 4 4M6 12l4 4 4-4" />
  </Icon>
);
export const CloseIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M5 5l10 10M15 5 5 15" />
  </Icon>
);
export const TickIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M4 10.5 8 14.5 16 6" />
  </Icon>
);
export const MoreIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M4.5 10h.01M10 10h.01M15.5 10h.01" strokeWidth="2.5" />
  </Icon>
);
export const TurnIcon = (props: IconProps) => (
  <Icon {...props}>
    <path d="M15.5 10a5.5 5.5 0 1 1-1.8-4.1" />
    <path d="M14.5 2.5v3.700h-3.7" />
  </Icon>
);

/** Marks of severity, as in the notes: a red square with a bar, a caret. */
export function StopMark() {
  return (
    <svg className="size-[13px] flex-none" viewBox="0 0 13 13" aria-hidden="true">
      <path d="M.5.5h12v12H.5z" className="fill-cut" />
      <path d="M3 6.5h7" stroke="#fff" strokeWidth="2" />
    </svg>
  );
}
export function FixMark() {
  return (
    <svg className="size-[13px] flex-none" viewBox="0 0 13 13" aria-hidden="true" fill="none" stroke="currentColor" strokeWidth="1.6">
      <path d="M1 12 6.5 1.5 12 12" />
    </svg>
  );
}
