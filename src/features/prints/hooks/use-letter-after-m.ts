import { useCallback, useRef, type KeyboardEvent } from 'react';
import { useAnnounce } from '@/components/live-region';

/**
 * `M` and then a letter, on a print that has the focus: the keyboard's short way to another pile. Any other
 * key in between calls it off. A key that it takes is marked as handled (`preventDefault`).
 */
export function useLetterAfterM(isOn: boolean, onLetter: (printId: string, letter: string) => void) {
  const awaiting = useRef<string | null>(null);
  const announce = useAnnounce();
  return useCallback(
    (printId: string, event: KeyboardEvent): void => {
      if (!isOn || event.ctrlKey || event.metaKey || event.altKey) return;
      if (awaiting.current === printId && /^\p{L}$/u.test(event.key)) {
        event.preventDefault();
        awaiting.current = null;
        onLetter(printId, event.key);
      } else if (event.key.toLowerCase() === 'm') {
        event.preventDefault();
        awaiting.current = printId;
        announce('Now the first letter of a pile');
      } else if (event.key !== 'Shift') {
        awaiting.current = null;
      }
    },
    [isOn, announce, onLetter],
  );
}
