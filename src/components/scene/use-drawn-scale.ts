import { useLayoutEffect, useState, type RefObject } from 'react';
import type { Size } from '#shared/model/rect';

/**
 * Device pixels per unit at which an SVG is drawn now, so that edges can be put on whole pixels; null
 * until it has been laid out. It follows the element's size and the browser's zoom.
 *
 * @param content - width and height of the SVG's view box.
 */
export function useDrawnScale(svg: RefObject<SVGSVGElement | null>, { width, height }: Size): number | null {
  const [scale, setScale] = useState<number | null>(null);
  useLayoutEffect(() => {
    const element = svg.current;
    if (!element) return;
    const measure = (): void => {
      const box = element.getBoundingClientRect();
      const perUnit = Math.min(box.width / width, box.height / height) * window.devicePixelRatio;
      setScale(perUnit > 0 ? perUnit : null);
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    window.addEventListener('resize', measure);
    return () => {
      observer.disconnect();
      window.removeEventListener('resize', measure);
    };
  }, [svg, width, height]);
  return scale;
}
