import { useSyncExternalStore } from 'react';
import { Notice } from './notice';

const subscribe = (onChange: () => void): (() => void) => {
  window.addEventListener('online', onChange);
  window.addEventListener('offline', onChange);
  return () => {
    window.removeEventListener('online', onChange);
    window.removeEventListener('offline', onChange);
  };
};

/** True while the browser says that there is a network. */
export const useOnline = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => navigator.onLine,
    () => true,
  );

/** Says that there is no network, for as long as there is none. */
export function OfflineNotice() {
  if (useOnline()) return null;
  return (
    <div className="fixed bottom-4 left-1/2 z-40 w-[min(460px,calc(100vw-32px))] -translate-x-1/2" role="status">
      <Notice>No network. What you see was loaded before; changes are kept on this machine where the bar says so, and go up when it is back.</Notice>
    </div>
  );
}
