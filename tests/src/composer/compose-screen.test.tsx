import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import type { SpreadDocument } from '#shared/model/spread';
import { ComposeScreen } from '@/features/composer/components/compose-screen';
import { ConflictDialog } from '@/features/composer/components/conflict-dialog';
import { DraftOffer } from '@/features/composer/components/draft-offer';
import { SaveState } from '@/features/composer/components/save-state';
import { ComposerProvider } from '@/features/composer/hooks/composer-context';
import { buildMat, buildPrint, buildSpread, matIdOf, printContent } from '../../support/builders';
import { memoryStorage, openTab, type Tab } from '../../support/composer';
import { renderInApp } from '../../support/render-app';

const A = matIdOf(1);
const B = matIdOf(2);
/** The keep zone begins half an inch from the left; the window on A begins at one inch and cuts it. */
const wide = buildPrint({ title: 'Three gulls', keepZone: { x: 50, y: 100, width: 300, height: 100 } });
const cut: SpreadDocument = buildSpread({
  mats: [buildMat({ id: A, w: 8, h: 6, content: printContent(wide, { x: inches(1), y: inches(1) }) }), buildMat({ id: B, x: 8, w: 6, h: 6 })],
  table: [wide.id],
});

function show(tab: Tab, mayEdit = true) {
  return renderInApp(
    <ComposerProvider value={tab.store}>
      <SaveState mayEdit={mayEdit} />
      <DraftOffer />
      <ConflictDialog />
      <ComposeScreen title="Out to the light" piles={[]} mayEdit={mayEdit} sortHref="/sort" />
    </ComposerProvider>,
  );
}

describe('Compose', () => {
  it('says beside the page that a cut takes the subject, and its remedy is one undo step', async () => {
    const tab = openTab({ doc: cut, prints: [wide] });
    show(tab);
    const notes = screen.getByRole('list', { name: 'Notes on the left page' });
    const stop = within(notes).getByText('Stop').closest('li')!;
    expect(stop).toHaveTextContent('Three gulls');
    await userEvent.click(within(stop).getByRole('button', { name: 'Slide the window' }));
    expect(within(notes).queryByText('Stop')).not.toBeInTheDocument();
    tab.store.getState().undo();
    await waitFor(() => expect(within(notes).getByText('Stop')).toBeInTheDocument());
    expect(tab.store.getState().canUndo).toBe(false);
  });

  it('names every mat with its size and what it carries, in reading order', () => {
    show(openTab({ doc: cut, prints: [wide] }));
    const names = screen.getAllByRole('button', { name: /^Mat [LR]\d/ }).map((button) => button.getAttribute('aria-label'));
    expect(names).toEqual(['Mat L1, 3 7/8 × 2 7/8 in, Three gulls', 'Mat L2, 2 7/8 × 2 7/8 in, bare']);
  });

  it('offers the tools of the mats that are chosen', async () => {
    const user = userEvent.setup();
    show(openTab({ doc: cut, prints: [wide] }));
    expect(screen.queryByRole('toolbar', { name: 'Mat' })).not.toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: /^Mat L1/ }));
    await user.keyboard('{Shift>}');
    await user.click(screen.getByRole('button', { name: /^Mat L2/ }));
    await user.keyboard('{/Shift}');
    const tools = await screen.findByRole('toolbar', { name: '2 mats' });
    await user.click(within(tools).getByRole('button', { name: 'Merge' }));
    // Two mats side by side of one height make one of 14 × 6 steps.
    await waitFor(() => expect(screen.getAllByRole('button', { name: /^Mat [LR]\d/ })).toHaveLength(1));
  });

  it('draws over the pages what pulls, at a press of W or of the button', async () => {
    const user = userEvent.setup();
    show(openTab({ doc: cut, prints: [wide] }));
    const overlay = () => screen.queryByRole('img', { name: /^Weights drawn over the pages: left 100, right 0 of 100\./ });
    expect(overlay()).not.toBeInTheDocument();
    await user.keyboard('w');
    expect(overlay()).toBeInTheDocument();
    // Two mats: two circles of weight, two stops of the eye.
    expect(overlay()!.querySelectorAll('.overlay-weight')).toHaveLength(2);
    expect([...overlay()!.querySelectorAll('.overlay-stop text')].map((stop) => stop.textContent)).toEqual(['1', '2']);
    await user.click(screen.getByRole('button', { name: /^Show weights/ }));
    expect(overlay()).not.toBeInTheDocument();
  });

  it('reads the measures on the rule for the spread and for each page', async () => {
    const user = userEvent.setup();
    show(openTab({ doc: cut, prints: [wide] }));
    await user.click(screen.getByRole('button', { name: 'On the rule' }));
    const panel = await screen.findByRole('dialog', { name: 'On the rule' });
    expect(await within(panel).findByText('2 mats on 2 left edges and 1 top edge.')).toBeInTheDocument();
    await user.click(within(panel).getByRole('button', { name: 'Right page' }));
    expect(within(panel).getByText('There are no mats to measure here yet.')).toBeInTheDocument();
  });

  it('leads from every note to the page that says why', () => {
    show(openTab({ doc: cut, prints: [wide] }));
    const notes = within(screen.getByRole('list', { name: 'Notes on the left page' }));
    expect(notes.getByRole('link', { name: /^Why\? This cut takes .*Opens in a new tab\.$/ })).toHaveAttribute('href', '/help/checks/keep-zone-cut');
  });

  it('shows a reader everything and no tool', () => {
    show(openTab({ doc: cut, prints: [wide], mayEdit: false }), false);
    expect(screen.getByText('Stop')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Add mat' })).not.toBeInTheDocument();
    expect(screen.getByText('Read only')).toBeInTheDocument();
  });
});

describe('the bar', () => {
  it('says saving, saved and offline', async () => {
    const tab = openTab({ doc: cut, prints: [wide] });
    show(tab);
    const state = () => document.querySelector('.save-state');
    expect(state()).toHaveTextContent('Saved');
    tab.store.getState().run({ id: 'mats.setColor', args: { matIds: [A], color: '#112233' } });
    await waitFor(() => expect(state()).toHaveTextContent('Saving…'));
    tab.server.next.push('no-answer');
    await tab.clock.pass(700);
    await waitFor(() => expect(state()).toHaveTextContent('Offline: kept on this machine'));
    await tab.clock.pass(2000);
    await waitFor(() => expect(state()).toHaveTextContent(/^Saved \d\d:\d\d$/));
  });
});

describe('a change from elsewhere to the same mat', () => {
  it('is shown before anything is overwritten, and the choice is kept', async () => {
    const tab = openTab({ doc: cut, prints: [wide] });
    show(tab);
    const before = tab.server.doc.mats[0]!;
    tab.server.otherEdit({ [`mat/${A}`]: { before, after: { ...before, color: '#aa3322' } } }, 'Ines');
    tab.store.getState().run({ id: 'mats.setColor', args: { matIds: [A], color: '#112233' } });
    await tab.clock.pass(700);
    const dialog = await screen.findByRole('dialog', { name: 'This spread was changed elsewhere' });
    expect(dialog).toHaveTextContent('Ines changed the same things');
    expect(within(dialog).getByText('Mat L1')).toBeInTheDocument();
    await userEvent.click(within(dialog).getByRole('button', { name: 'Keep mine' }));
    await tab.clock.pass(700);
    await waitFor(() => expect(tab.server.doc.mats[0]!.color).toBe('#112233'));
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });
});

describe('a tab that crashed', () => {
  it('gives back what it could not save', async () => {
    const storage = memoryStorage();
    const crashed = openTab({ doc: cut, prints: [wide], storage });
    crashed.store.getState().run({ id: 'mats.setColor', args: { matIds: [A], color: '#112233' } });
    const next = openTab({ doc: cut, prints: [wide], storage, server: crashed.server });
    show(next);
    await userEvent.click(await screen.findByRole('button', { name: 'Put back' }));
    await waitFor(() => expect(next.store.getState().doc.mats[0]!.color).toBe('#112233'));
    expect(screen.queryByRole('button', { name: 'Put back' })).not.toBeInTheDocument();
  });
});
