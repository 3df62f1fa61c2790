import type { ReactNode } from 'react';

interface FactProps {
  readonly label: string;
  /** The control that the label names; left out, the row is a group of its own. */
  readonly htmlFor?: string;
  readonly className?: string;
  readonly children: ReactNode;
}

/** One row of what is known of a print: its name at the left, its value or choices at the right. */
export function Fact({ label, htmlFor, className = '', children }: FactProps) {
  return (
    <div className="fact" {...(htmlFor === undefined && { role: 'group', 'aria-label': label })}>
      {htmlFor === undefined ? (
        <span className="fact-label" aria-hidden="true">
          {label}
        </span>
      ) : (
        <label className="fact-label" htmlFor={htmlFor}>
          {label}
        </label>
      )}
      <div className={`fact-value ${className}`}>{children}</div>
    </div>
  );
}
