import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Mark } from './mark';

export interface Crumb {
  readonly label: string;
  readonly to: string;
}

interface TopBarProps {
  /** Where the screen stands, from the outside in. */
  readonly crumbs?: readonly Crumb[];
  /** The screen's own name. */
  readonly title?: ReactNode;
  /** A StageBar. */
  readonly stages?: ReactNode;
  /** Actions at the right. */
  readonly children?: ReactNode;
}

/** The bar over every screen: mark, where we are, stages, actions. */
export function TopBar({ crumbs = [], title, stages, children }: TopBarProps) {
  return (
    <header className="bar max-sm:px-3">
      <Link to="/" className="flex h-[51px] flex-none max-sm:h-[55px] items-center gap-[9px] font-serif text-19 leading-none no-underline" aria-label="Pairleaf: albums">
        <Mark />
        <span className={title === undefined ? undefined : 'max-md:hidden'}>Pairleaf</span>
      </Link>
      {(title !== undefined || crumbs.length > 0) && (
        <nav aria-label="Where you are" className="bar-where max-sm:ml-2 max-sm:pl-3">
          {crumbs.map(({ label, to }) => (
            <span key={to} className={`flex min-w-0 items-center gap-[9px] ${stages === undefined ? 'max-sm:hidden' : 'max-xl:hidden'}`}>
              <Link to={to} className="truncate text-ink-2 no-underline hover:text-ink hover:underline">
                {label}
              </Link>
              {title !== undefined && (
                <span aria-hidden="true" className="text-ink-3">
                  ›
                </span>
              )}
            </span>
          ))}
          {title !== undefined && <span className="truncate font-serif text-16">{title}</span>}
        </nav>
      )}
      {stages !== undefined && <div className="bar-stages">{stages}</div>}
      <div className="ml-auto flex flex-none items-center gap-1">{children}</div>
    </header>
  );
}
