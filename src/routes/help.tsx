import { TopBar } from '@/components/top-bar';
import { HelpIndex } from '@/features/help/components/help-index';
import '@/features/help/help.css';

/** `/help`: every check, with a search. */
export function Component() {
  return (
    <>
      <TopBar title="Help" />
      <HelpIndex />
    </>
  );
}
