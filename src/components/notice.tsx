import type { ReactNode } from 'react';
import { StopMark } from './icons';

interface NoticeProps {
  /** `stop`: something did not work. `note`: something to know. */
  readonly tone?: 'stop' | 'note';
  readonly children: ReactNode;
  readonly className?: string;
  /** Speak it as soon as it appears. */
  readonly alert?: boolean;
}

/** One plain sentence on paper with a coloured left edge: what was wrong, what is safe, what to do. */
export function Notice({ tone = 'stop', children, className = '', alert = false }: NoticeProps) {
  return (
    <div className={`errline ${className}`} data-tone={tone} role={alert ? 'alert' : undefined}>
      {tone === 'stop' && <StopMark />}
      <div className="min-w-0 flex-1">{children}</div>
    </div>
  );
}

/** Says that there is nothing here yet, and the one thing to do about it. */
export function EmptyLine({ children, className = '' }: { readonly children: ReactNode; readonly className?: string }) {
  return <div className={`emptyline ${className}`}>{children}</div>;
}
