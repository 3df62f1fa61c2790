import { Suspense, useEffect, useState, type ReactNode } from 'react';

interface AfterPagesProps {
  /** What holds the place until then. */
  readonly fallback?: ReactNode;
  readonly children: ReactNode;
}

/** Holds lazy parts of Compose back until the pages are drawn, so that fetching them does not delay the first drag. */
export function AfterPages({ fallback = null, children }: AfterPagesProps) {
  const [areDrawn, setAreDrawn] = useState(false);
  useEffect(() => {
    const frame = requestAnimationFrame(() => setAreDrawn(true));
    return () => cancelAnimationFrame(frame);
  }, []);
  return <Suspense fallback={fallback}>{areDrawn ? children : fallback}</Suspense>;
}
