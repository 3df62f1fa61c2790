import { TopBar } from '@/components/top-bar';
import { WeightPage } from '@/features/help/components/weight-page';
import '@/features/help/help.css';

/** `/help/weight`: visual weight, the eye's path and the measures on the rule. */
export function Component() {
  return (
    <>
      <TopBar crumbs={[{ label: 'Help', to: '/help' }]} title="Weight and measures" />
      <WeightPage />
    </>
  );
}
