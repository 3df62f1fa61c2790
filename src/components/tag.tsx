import type { ReactNode } from 'react';

interface TagProps {
  /** `stop`: red, for what must not happen. `quiet`: dashed, for what is absent or pending. `pencil`: for what is being done. */
  readonly tone?: 'plain' | 'stop' | 'quiet' | 'pencil';
  readonly children: ReactNode;
  readonly className?: string;
  readonly title?: string;
}

export function Tag({ tone = 'plain', children, className = '', title }: TagProps) {
  return (
    <span className={`tag ${className}`} data-tone={tone} title={title}>
      {children}
    </span>
  );
}
