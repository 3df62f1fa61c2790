import { useCallback, useState, type RefCallback } from 'react';

/**
 * The width of an element in px, as it changes; `fallback` until it is on the page.
 *
 * @returns the width, and the ref to put on the element.
 */
export function useWidth<T extends Element>(fallback: number): readonly [number, RefCallback<T>] {
  const [width, setWidth] = useState(fallback);
  const ref = useCallback((element: T | null) => {
    if (element === null) return undefined;
    const observer = new ResizeObserver(([entry]) => entry && setWidth(entry.contentRect.width));
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [width, ref];
}
