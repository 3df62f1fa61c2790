import { useEffect, useState } from 'react';

const hasFiles = (event: DragEvent): boolean => event.dataTransfer?.types.includes('Files') === true;

/**
 * Takes files dropped anywhere on the window. A file that misses would otherwise open in the browser's
 * place and take the page away.
 *
 * @returns whether files hover over the window now.
 */
export function useFileDrop(onFiles: (files: readonly File[]) => void): boolean {
  const [isOver, setIsOver] = useState(false);
  useEffect(() => {
    let depth = 0;
    const enter = (event: DragEvent): void => {
      if (!hasFiles(event)) return;
      depth += 1;
      setIsOver(true);
    };
    const leave = (event: DragEvent): void => {
      if (!hasFiles(event)) return;
      depth = Math.max(0, depth - 1);
      if (depth === 0) setIsOver(false);
    };
    const over = (event: DragEvent): void => {
      if (hasFiles(event)) event.preventDefault();
    };
    const drop = (event: DragEvent): void => {
      if (!hasFiles(event)) return;
      event.preventDefault();
      depth = 0;
      setIsOver(false);
      onFiles(Array.from(event.dataTransfer?.files ?? []));
    };
    window.addEventListener('dragenter', enter);
    window.addEventListener('dragleave', leave);
    window.addEventListener('dragover', over);
    window.addEventListener('drop', drop);
    return () => {
      window.removeEventListener('dragenter', enter);
      window.removeEventListener('dragleave', leave);
      window.removeEventListener('dragover', over);
      window.removeEventListener('drop', drop);
    };
  }, [onFiles]);
  return isOver;
}
