import type { ReactNode } from 'react';
import { TopBar } from './top-bar';

interface PlainPageProps {
  readonly title: string;
  /** False inside a screen whose own bar still stands. */
  readonly hasBar?: boolean;
  readonly children: ReactNode;
}

/** A screen with one thing to say, on one empty mat. */
export function PlainPage({ title, hasBar = true, children }: PlainPageProps) {
  return (
    <>
      {hasBar && <TopBar />}
      <main className="grid place-items-center px-6 py-[12vh]">
        <div className="bare-page w-full max-w-[560px] p-6 sm:p-12">
          <div className="relative bg-paper p-6 sm:p-8">
            <h1 className="mb-3 text-24">{title}</h1>
            {children}
          </div>
        </div>
      </main>
    </>
  );
}
