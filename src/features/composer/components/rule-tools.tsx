import { Popover } from 'radix-ui';
import { lazy, Suspense } from 'react';
import type { SpreadView } from '#shared/checks/check';

// The measures come when they are asked for.
const RulePanel = lazy(async () => ({ default: (await import('./rule-panel')).RulePanel }));

interface RuleToolsProps {
  readonly view: SpreadView;
  readonly areWeightsShown: boolean;
  readonly onToggleWeights: () => void;
}

/** Beside the beam: the measures on the rule, and what pulls, drawn over the pages. */
export function RuleTools({ view, areWeightsShown, onToggleWeights }: RuleToolsProps) {
  return (
    <div className="rule-tools" role="group" aria-label="Weight">
      <Popover.Root>
        <Popover.Trigger asChild>
          <button type="button" className="mat-action">
            On the rule
          </button>
        </Popover.Trigger>
        <Popover.Portal>
          <Popover.Content className="action-sheet rule-sheet" align="end" sideOffset={6} collisionPadding={12} aria-label="On the rule">
            <Suspense fallback={<div aria-busy="true" />}>
              <RulePanel view={view} />
            </Suspense>
          </Popover.Content>
        </Popover.Portal>
      </Popover.Root>
      <button type="button" className="mat-action" aria-pressed={areWeightsShown} aria-keyshortcuts="W" title="Weights, centres, thirds, horizons and the eye’s path, over the pages (W)" onClick={onToggleWeights}>
        Show weights <kbd aria-hidden="true">W</kbd>
      </button>
    </div>
  );
}
