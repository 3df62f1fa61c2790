import { Outlet, ScrollRestoration } from 'react-router-dom';
import { LiveRegion } from '@/components/live-region';
import { OfflineNotice } from '@/components/offline-notice';

export function Root() {
  return (
    <LiveRegion>
      <OfflineNotice />
      <Outlet />
      <ScrollRestoration />
    </LiveRegion>
  );
}
