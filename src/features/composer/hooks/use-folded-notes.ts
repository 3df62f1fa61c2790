import { useState } from 'react';

const KEY = 'pairleaf.fold-consider';

/** Whether notes to consider are folded away; kept in this browser, for every spread. */
export function useFoldedNotes(): readonly [boolean, (isFolded: boolean) => void] {
  const [isFolded, setIsFolded] = useState(readFlag);
  return [
    isFolded,
    (next) => {
      setIsFolded(next);
      try {
        localStorage.setItem(KEY, String(next));
      } catch {
        // A browser that keeps nothing still folds until the page is left.
      }
    },
  ];
}

function readFlag(): boolean {
  try {
    return localStorage.getItem(KEY) === 'true';
  } catch {
    return false;
  }
}
