import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import type { Print } from '#shared/model/print';
import { DEFAULT_REVEAL, TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { SortView } from '@/features/prints/components/sort-view';
import { buildPrint, formatOf, idOf, printIdOf } from '../../support/builders';
import { fakeApi, problem } from '../../support/fake-api';
import { renderInApp, STUDIO_ID } from '../../support/render-app';

const LINE = idOf(1, 6);
const LIGHT = idOf(2, 6);
const pile = (id: string, name: string, position: number) => ({ id, name, position, studioId: STUDIO_ID, sharedWithContributors: false });

const gulls = buildPrint({ id: printIdOf(1), title: 'Three gulls', pileId: LINE, studioId: STUDIO_ID });
const scones = buildPrint({ id: printIdOf(2), title: 'Two scones', pileId: LINE, studioId: STUDIO_ID, marks: { instantFilm: true } });

function setUp({ prints = [gulls, scones], patch = 'saves' as 'saves' | 'is stale', mayEdit = true, onTable = undefined as Set<string> | undefined } = {}) {
  let stored: Print[] = prints;
  const calls = fakeApi({
    'GET /studios/:id/piles': [200, { piles: [pile(LINE, 'The line', 0), pile(LIGHT, 'Harbour light', 1)] }],
    'GET /studios/:id/prints': () => [200, { prints: stored, nextCursor: null }],
    'PATCH /prints/:id': ({ path, body }) => {
      if (patch === 'is stale') return problem('stale-revision', 409, 'Changed meanwhile.');
      const { baseRevision, marks, ...change } = body as { baseRevision: number; marks?: Partial<Print['marks']> };
      const before = stored.find(({ id }) => path.endsWith(id))!;
      const after = { ...before, ...change, marks: { ...before.marks, ...marks }, revision: baseRevision + 1 };
      stored = stored.map((print) => (print.id === after.id ? after : print));
      return [200, after];
    },
  });
  const setOnTable = vi.fn((_ids: readonly string[], on: boolean) => (on ? null : 'Still on a mat: lift it off first.'));
  renderInApp(
    <SortView
      studioId={STUDIO_ID}
      sizing={{ format: formatOf('12x12in'), reveal: DEFAULT_REVEAL, trim: TRIM_SETTINGS_INCH, unit: 'in' }}
      mayEdit={mayEdit}
      mayDelete={false}
      onTable={onTable}
      setOnTable={setOnTable}
    />,
  );
  return { calls, setOnTable };
}

const lying = (pileName: string): Promise<HTMLElement> => screen.findByRole('region', { name: pileName });

describe('prints in their piles', () => {
  it('stand under their pile with their size and what must not happen to them', async () => {
    setUp();
    const line = await lying('The line');
    expect(within(line).getByRole('button', { name: 'Three gulls, 6 × 4 in' })).toBeVisible();
    expect(within(line).getByRole('button', { name: 'Two scones, 6 × 4 in, instant film, do not cut' })).toBeVisible();
    expect(within(line).getByText('Do not cut')).toBeVisible();
  });

  it('go to another pile by M and its first letter, and say so', async () => {
    const { calls } = setUp();
    (await screen.findByRole('button', { name: /Three gulls/ })).focus();
    await userEvent.keyboard('mh');
    const harbour = await lying('Harbour light');
    expect(await within(harbour).findByRole('button', { name: /Three gulls/ })).toBeVisible();
    expect(calls.find(({ method }) => method === 'PATCH')?.body).toEqual({ baseRevision: gulls.revision, pileId: LIGHT });
    expect(screen.getByText('Three gulls: placed in Harbour light')).toBeInTheDocument();
  });

  it('stay where they are when no other pile begins with the letter', async () => {
    const { calls } = setUp();
    (await screen.findByRole('button', { name: /Three gulls/ })).focus();
    await userEvent.keyboard('mx');
    expect(await screen.findByText('No other pile begins with X')).toBeInTheDocument();
    expect(calls.some(({ method }) => method === 'PATCH')).toBe(false);
  });

  it('go back, with a word, when someone else changed them meanwhile', async () => {
    setUp({ patch: 'is stale' });
    (await screen.findByRole('button', { name: /Three gulls/ })).focus();
    await userEvent.keyboard('mh');
    expect(await screen.findByRole('alert')).toHaveTextContent('Changed meanwhile.');
    expect(await within(await lying('The line')).findByRole('button', { name: /Three gulls/ })).toBeVisible();
  });

  it('are chosen for a spread one by one or a pile at a time', async () => {
    const { setOnTable } = setUp({ onTable: new Set([gulls.id]) });
    await userEvent.click(await screen.findByRole('checkbox', { name: /Two scones/ }));
    expect(setOnTable).toHaveBeenLastCalledWith([scones.id], true);
    await userEvent.click(screen.getByRole('button', { name: 'Choose all of The line' }));
    expect(setOnTable).toHaveBeenLastCalledWith([gulls.id, scones.id], true);
  });

  it('say why one of them stays, when it lies on a mat', async () => {
    setUp({ onTable: new Set([gulls.id]) });
    await userEvent.click(await screen.findByRole('checkbox', { name: /Three gulls/ }));
    expect(screen.getByRole('alert')).toHaveTextContent('Still on a mat: lift it off first.');
  });

  it('offer nothing to change to someone who only looks', async () => {
    setUp({ mayEdit: false });
    await userEvent.click(await screen.findByRole('button', { name: /Three gulls/ }));
    expect(screen.queryByRole('button', { name: 'Add prints' })).toBeNull();
    expect(screen.queryByRole('button', { name: /More for the pile/ })).toBeNull();
    expect(screen.getByRole('button', { name: 'One of a kind' })).toBeDisabled();
  });
});

describe('an opened print', () => {
  it('is marked one of a kind with one press, and cautions at once', async () => {
    const { calls } = setUp();
    await userEvent.click(await screen.findByRole('button', { name: /Three gulls/ }));
    await userEvent.click(screen.getByRole('button', { name: 'One of a kind' }));
    expect(await screen.findByText(/copy it first and cut the copy/)).toBeVisible();
    expect(calls.find(({ method }) => method === 'PATCH')?.body).toEqual({ baseRevision: gulls.revision, copies: 1, marks: { oneOfAKind: true } });
  });

  it('takes another size, typed in fractions of an inch', async () => {
    const { calls } = setUp();
    await userEvent.click(await screen.findByRole('button', { name: /Three gulls/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Other' }));
    const [width, height] = [screen.getByRole('textbox', { name: 'Width' }), screen.getByRole('textbox', { name: 'Height' })];
    await userEvent.clear(width);
    await userEvent.type(width, '4 1/2');
    await userEvent.clear(height);
    await userEvent.type(height, '3');
    await userEvent.click(screen.getByRole('button', { name: 'Set size' }));
    expect(calls.find(({ method }) => method === 'PATCH')?.body).toMatchObject({ paperWidth: 18288, paperHeight: 12192 });
  });

  it('says what it cannot read instead of a size', async () => {
    const { calls } = setUp();
    await userEvent.click(await screen.findByRole('button', { name: /Three gulls/ }));
    await userEvent.click(screen.getByRole('button', { name: 'Other' }));
    await userEvent.clear(screen.getByRole('textbox', { name: 'Width' }));
    await userEvent.type(screen.getByRole('textbox', { name: 'Width' }), 'four');
    await userEvent.click(screen.getByRole('button', { name: 'Set size' }));
    expect(screen.getByRole('alert')).toHaveTextContent('Write inches such as 3 1/2 or 3.5, from 1/2 to 40.');
    expect(calls.some(({ method }) => method === 'PATCH')).toBe(false);
  });
});
