import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import { ComposeScreen } from '@/features/composer/components/compose-screen';
import { ComposerProvider } from '@/features/composer/hooks/composer-context';
import { buildMat, buildPrint, buildSpread, idOf, matIdOf, printContent } from '../../support/builders';
import { openTab, SPREAD_ID } from '../../support/composer';
import { fakeApi, problem, type FakeCall } from '../../support/fake-api';
import { renderInApp } from '../../support/render-app';

const STUDIO_ID = idOf(1, 9);
/** Whole, with card that shows much more beside the print than above it: one note to consider. */
const small = buildPrint({ title: 'Pim', paperWidth: inches(2), paperHeight: inches(3), imageWidth: 200, imageHeight: 300 });
const doc = buildSpread({ mats: [buildMat({ id: matIdOf(1), w: 12, h: 7, content: printContent(small, { mode: 'whole' }) })], table: [small.id] });

function show(mayEdit = true) {
  const tab = openTab({ doc, prints: [small], mayEdit });
  renderInApp(
    <ComposerProvider value={tab.store}>
      <ComposeScreen title="Harbour day" piles={[]} mayEdit={mayEdit} sortHref="/sort" />
    </ComposerProvider>,
  );
  return { tab, user: userEvent.setup() };
}

const answer = ({ path, body }: FakeCall) => {
  const { muted = null, thresholds = {} } = body as { muted?: boolean | null; thresholds?: Record<string, number> | null };
  const isSaid = muted !== null || Object.keys(thresholds ?? {}).length > 0;
  return [200, { checks: isSaid ? [{ checkId: path.split('/').at(-1), muted, thresholds: thresholds ?? {} }] : [] }] as const;
};
const api = () => fakeApi({ 'PATCH /spreads/:id/checks/:checkId': answer, 'PATCH /studios/:id/checks/:checkId': answer });
const LOPSIDED = 'A lopsided whole print';
const note = () => screen.queryByText(/of card beside it/);
const openMenu = (user: ReturnType<typeof userEvent.setup>) => user.click(screen.getByRole('button', { name: `More on “${LOPSIDED}”` }));

describe('checks that a person mutes', { timeout: 20_000 }, () => {
  afterEach(() => localStorage.clear());

  it('leave the margin, are listed, and are heard again', async () => {
    const calls = api();
    const { user } = show();
    expect(note()).toBeInTheDocument();
    await openMenu(user);
    await user.click(screen.getByRole('menuitem', { name: 'Mute on this spread' }));
    await waitFor(() => expect(note()).not.toBeInTheDocument());
    expect(calls).toMatchObject([{ path: `/spreads/${SPREAD_ID}/checks/whole-lopsided`, body: { muted: true } }]);
    await user.click(screen.getByRole('button', { name: '1 muted' }));
    const list = screen.getByRole('dialog', { name: 'Muted checks' });
    expect(list).toHaveTextContent('on this spread');
    await user.click(within(list).getByRole('button', { name: `Hear “${LOPSIDED}” again` }));
    await waitFor(() => expect(note()).toBeInTheDocument());
    expect(calls[1]).toMatchObject({ body: { muted: null } });
    expect(screen.queryByText('1 muted')).not.toBeInTheDocument();
  });

  it('can be muted for the whole studio', async () => {
    const calls = api();
    const { user } = show();
    await openMenu(user);
    await user.click(screen.getByRole('menuitem', { name: 'Mute in the whole studio' }));
    await user.click(await screen.findByRole('button', { name: '1 muted' }));
    expect(screen.getByRole('dialog', { name: 'Muted checks' })).toHaveTextContent('in the whole studio');
    expect(calls[0]?.path).toBe(`/studios/${STUDIO_ID}/checks/whole-lopsided`);
  });

  it('stay, with the reason told, where the server refuses', async () => {
    fakeApi({ 'PATCH /spreads/:id/checks/:checkId': problem('forbidden', 403, 'You may look at this spread, not change it.') });
    const { user } = show();
    await openMenu(user);
    await user.click(screen.getByRole('menuitem', { name: 'Mute on this spread' }));
    expect(await screen.findByText('You may look at this spread, not change it.')).toBeInTheDocument();
    expect(note()).toBeInTheDocument();
  });

  it('are no business of a reader', () => {
    show(false);
    expect(note()).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: `More on “${LOPSIDED}”` })).not.toBeInTheDocument();
  });
});

describe('the limit of a check', { timeout: 20_000 }, () => {
  it('is set in the reader’s unit, within its range', async () => {
    const calls = api();
    const { user } = show();
    await openMenu(user);
    await user.click(screen.getByRole('menuitem', { name: 'Set its limit …' }));
    const field = await screen.findByRole('textbox', { name: 'Card beside and above may differ by' });
    expect(field).toHaveValue('1/2');
    await user.clear(field);
    await user.type(field, '4');
    expect(screen.getByText('Give a number from 1/8 in to 3 in.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Set it' })).toBeDisabled();
    await user.clear(field);
    await user.type(field, '2 1/2');
    await user.click(screen.getByRole('button', { name: 'Set it' }));
    await waitFor(() => expect(note()).not.toBeInTheDocument());
    expect(calls).toMatchObject([{ body: { thresholds: { difference: inches(2.5) } } }]);
    expect(screen.queryByRole('dialog')).not.toBeInTheDocument();
  });
});

describe('notes to consider', () => {
  afterEach(() => localStorage.clear());

  it('are folded away and stay so in this browser', async () => {
    const { user } = show();
    await user.click(screen.getByRole('button', { name: 'Fold 1 to consider' }));
    expect(note()).not.toBeInTheDocument();
    expect(localStorage.getItem('pairleaf.fold-consider')).toBe('true');
    await user.click(screen.getByRole('button', { name: 'Show 1 to consider' }));
    expect(note()).toBeInTheDocument();
  });
});
