import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { placeScheme } from '#shared/colour/schemes';
import { indexStash } from '#shared/colour/snap';
import type { Scheme } from '#shared/model/spread';
import type { StashSheet } from '#shared/model/stash';
import { SchemeStash } from '@/features/composer/components/scheme-stash';
import { ComposerProvider } from '@/features/composer/hooks/composer-context';
import { StashProvider } from '@/features/composer/hooks/stash-context';
import { buildMat, buildPrint, buildSpread, printContent } from '../../support/builders';
import { openTab } from '../../support/composer';
import { renderInApp } from '../../support/render-app';
import { buildSheet } from '../../support/stash';

const print = buildPrint();
const doc = buildSpread({ mats: [buildMat({ w: 12, h: 8, content: printContent(print) }), buildMat({ page: 'right', w: 8, h: 8 })], table: [print.id] });
const scheme: Scheme = {
  character: 'echo',
  colors: {
    base: { hex: '#efe6d2', printIds: [] },
    main: { hex: '#1d4f5c', printIds: [] },
    second: { hex: '#b9cfc4', printIds: [] },
    accent: { hex: '#cf6a3c', printIds: [] },
  },
};

function show(sheets: readonly StashSheet[], isEditable = true) {
  const tab = openTab({ doc, prints: [print] });
  const place = (wanted: Scheme) => placeScheme(tab.store.getState(), wanted);
  renderInApp(
    <ComposerProvider value={tab.store}>
      <StashProvider value={indexStash(sheets)}>
        <SchemeStash
          scheme={scheme}
          args={place(scheme)}
          isWide={false}
          isEditable={isEditable}
          onApply={(wanted) => tab.store.getState().run({ id: 'scheme.apply', args: place(wanted) })}
        />
      </StashProvider>
    </ComposerProvider>,
  );
  return tab;
}
const oat = buildSheet({ name: 'Oat', hex: '#f0e7d3', quantity: 4 });
const rest = [buildSheet({ name: 'Harbour', hex: '#1d4f5c' }), buildSheet({ name: 'Sea glass', hex: '#b9cfc4' }), buildSheet({ name: 'Buoy', hex: '#cf6a3c', quantity: 4 })];

describe('a scheme in Compose and the stash', () => {
  it('says that all is there, and a press takes the sheets’ own colours in one undo step', async () => {
    const tab = show([oat, ...rest]);
    await userEvent.click(screen.getByRole('button', { name: /^Use sheets for echo: Oat, close: 4 sheets free, 2 needed/ }));
    expect(tab.store.getState().doc.pages.left?.color).toBe('#f0e7d3');
    expect(screen.getByText('in sheets')).toBeInTheDocument();
    tab.store.getState().undo();
    expect(tab.store.getState().doc).toEqual(doc);
  });

  it('says honestly what must be bought: more of a sheet, or what nothing is near to', () => {
    show([{ ...oat, quantity: 1 }, ...rest]);
    expect(screen.getByText('buy 1 Oat')).toBeInTheDocument();
  });

  it('speaks of nothing where the stash is empty, and offers a reader no press', () => {
    show([]);
    expect(screen.queryByText(/stash|buy/)).not.toBeInTheDocument();
    show([oat, ...rest], false);
    expect(screen.getByText('in stash: all')).toBeInTheDocument();
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });
});
