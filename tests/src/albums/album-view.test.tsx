import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { Role } from '#shared/model/people';
import { DEFAULT_BINDING } from '#shared/model/page-format';
import { AlbumView } from '@/features/albums/components/album-view';
import { buildMat, buildSpread, formatOf, idOf } from '../../support/builders';
import { fakeApi, problem } from '../../support/fake-api';
import { renderInApp, STUDIO_ID } from '../../support/render-app';

const ALBUM = idOf(1, 8);
const spread = (n: number, title: string, binned = false) => ({
  id: idOf(n, 5),
  albumId: ALBUM,
  studioId: STUDIO_ID,
  title,
  position: n,
  state: 'draft',
  revision: 1,
  updatedAt: '2026-12-01T10:00:00.000Z',
  binned,
  document: buildSpread({ mats: [buildMat({ id: idOf(n, 2) })] }),
});

function setUp({ role = 'owner' as Role, refuse = false } = {}) {
  const spreads = [spread(1, 'Setting off'), spread(2, 'Out to the light'), spread(3, 'Spoiled', true)];
  const calls = fakeApi({
    'GET /albums/:id': [200, { id: ALBUM, studioId: STUDIO_ID, title: 'Long Weekends', format: formatOf('12x12in'), binding: DEFAULT_BINDING, spreadCount: 2, binned: false }],
    'GET /albums/:id/spreads': [200, { spreads, prints: [] }],
    'PATCH /spreads/:id': ({ path, body }) =>
      refuse ? problem('unavailable', 503, 'The database is away: try again.') : [200, { ...spreads.find(({ id }) => path.endsWith(id))!, ...(body as object) }],
  });
  renderInApp(<AlbumView albumId={ALBUM} />, { role });
  return calls;
}

const spreadNames = () => screen.getAllByRole('heading', { level: 2 }).map(({ textContent }) => textContent);

describe('an album', () => {
  it('shows its live spreads in reading order, with what is still bare', async () => {
    setUp();
    expect(await screen.findByRole('link', { name: 'Setting off' })).toHaveAttribute('href', `/spreads/${idOf(1, 5)}`);
    expect(spreadNames()).toEqual(['Setting off', 'Out to the light']);
    expect(screen.getAllByText('1 mat, 1 bare')).toHaveLength(2);
  });

  it('moves a spread at once and sends its new place', async () => {
    const calls = setUp();
    await userEvent.click(await screen.findByRole('button', { name: 'More for Setting off' }));
    await userEvent.click(screen.getByRole('menuitem', { name: 'Move later' }));
    expect(calls.find(({ method }) => method === 'PATCH')).toMatchObject({ path: `/spreads/${idOf(1, 5)}`, body: { position: 1 } });
    expect(screen.getByText('Setting off is now spread 2 of 2')).toBeInTheDocument();
  });

  it('takes the move back, with a word, when the server cannot', async () => {
    setUp({ refuse: true });
    await userEvent.click(await screen.findByRole('button', { name: 'More for Setting off' }));
    await userEvent.click(screen.getByRole('menuitem', { name: 'Put in the bin' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('The database is away: try again.');
    expect(spreadNames()).toEqual(['Setting off', 'Out to the light']);
  });

  it('lists what lies in the bin, to be taken out again', async () => {
    const calls = setUp();
    await userEvent.click(await screen.findByText('Bin'));
    await userEvent.click(within(screen.getByRole('group')).getByRole('button', { name: 'Take out Spoiled' }));
    expect(calls.find(({ method }) => method === 'PATCH')?.body).toEqual({ binned: false });
  });

  it('shows a reviewer no control that changes anything', async () => {
    setUp({ role: 'reviewer' });
    await screen.findByRole('link', { name: 'Setting off' });
    expect(screen.queryAllByRole('button')).toEqual([]);
    expect(screen.queryByText('Bin')).toBeNull();
  });
});
