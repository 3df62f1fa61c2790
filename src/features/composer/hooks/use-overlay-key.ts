import { useEffect } from 'react';

/** Calls back when W is pressed alone, while no field or dialog has the focus. */
export function useOverlayKey(onPress: () => void): void {
  useEffect(() => {
    const handleKeyDown = (event: KeyboardEvent): void => {
      const target = event.target as HTMLElement;
      const isElsewhere = event.defaultPrevented || event.repeat || event.ctrlKey || event.metaKey || event.altKey;
      if (isElsewhere || event.key.toLowerCase() !== 'w' || target.closest('input, textarea, select, [contenteditable], [role="dialog"]:not(.rule-sheet)')) return;
      event.preventDefault();
      onPress();
    };
    window.addEventListener('keydown', handleKeyDown);
    return () => window.removeEventListener('keydown', handleKeyDown);
  }, [onPress]);
}
