import type { Clock } from './autosave';
import type { PageListener } from './composer-store';
import { storedDrafts } from './drafts';

export const browserClock: Clock = {
  now: () => new Date().toISOString(),
  after: (delayMs, callback) => {
    const timer = setTimeout(callback, delayMs);
    return () => clearTimeout(timer);
  },
};

/** Reading `localStorage` itself throws where the browser blocks it, so it is read at each use. */
export const browserDrafts = storedDrafts(() => localStorage);

/** `visibilitychange` is the last event that phones and closing tabs reliably send; `pagehide` follows where the page goes for good. */
export function listenToPage({ hide, leave, online, offline }: PageListener): () => void {
  const handleVisibility = (): void => {
    if (document.visibilityState === 'hidden') hide();
  };
  document.addEventListener('visibilitychange', handleVisibility);
  window.addEventListener('pagehide', leave);
  window.addEventListener('online', online);
  window.addEventListener('offline', offline);
  return () => {
    document.removeEventListener('visibilitychange', handleVisibility);
    window.removeEventListener('pagehide', leave);
    window.removeEventListener('online', online);
    window.removeEventListener('offline', offline);
  };
}
