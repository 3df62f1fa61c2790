import type { ReactNode } from 'react';
import { Mark } from '@/components/mark';
import { SamplePage } from './sample-page';

/** The spread that everyone sees before they are in: a finished left page, and a form on the right one. */
export function SignFrame({ title, children }: { readonly title: ReactNode; readonly children: ReactNode }) {
  return (
    <main className="grid min-h-dvh content-center justify-center px-0 py-6 max-lg:justify-stretch max-lg:content-start lg:px-12">
      <div className="relative flex h-[96px] items-start max-lg:h-16 max-lg:items-center max-lg:px-6">
        <p className="flex items-center gap-[13px] font-serif text-28 leading-none">
          <Mark className="h-[33px] w-9" />
          Pairleaf
        </p>
        <svg
          className="absolute bottom-0 left-1/2 -translate-x-1/2 fill-ink max-lg:hidden"
          width="240"
          height="62"
          viewBox="0 0 240 62"
          aria-hidden="true"
        >
          <g transform="rotate(-3.5 120 26)">
            <path d="M20 25h200v2H20z" />
            <path d="M26 15h10v10H26zM208 20h5v5h-5z" />
          </g>
          <path d="M119.5 26h1v26h-1zM113 60l7-12 7 12Z" />
        </svg>
      </div>
      <div className="sample-spread">
        <SamplePage />
        <div className="sample-page sample-grid">
          <div className="sample-form">
            <h1 className="mb-[18px] text-28">{title}</h1>
            {children}
          </div>
        </div>
      </div>
      <div className="flex h-14 items-start pt-3 text-13 text-ink-2 max-lg:hidden" aria-hidden="true">
        <div className="flex w-1/2 items-center gap-3">
          <i className="h-[14px] w-px bg-rule-2" />
          <i className="h-px flex-1 bg-rule-2" />
          <span className="num">12 in</span>
          <i className="h-px flex-1 bg-rule-2" />
          <i className="h-[14px] w-px bg-rule-2" />
        </div>
      </div>
    </main>
  );
}
