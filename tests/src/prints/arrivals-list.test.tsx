import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { ArrivalsList } from '@/features/prints/components/arrivals-list';
import type { Arrival } from '@/features/prints/model/upload-queue';

const arrival = (parts: Partial<Arrival> & Pick<Arrival, 'id' | 'state'>): Arrival => ({
  name: `${parts.id}.jpg`,
  share: 0,
  reason: null,
  printId: null,
  ...parts,
});

describe('the list of arriving files', () => {
  it('shows nothing while nothing arrives', () => {
    const { container } = render(<ArrivalsList arrivals={[]} onRetry={vi.fn()} onClear={vi.fn()} />);
    expect(container).toBeEmptyDOMElement();
  });

  it('gives each file its progress, its result or the reason for its refusal', () => {
    render(
      <ArrivalsList
        arrivals={[
          arrival({ id: 'gulls', state: 'sending', share: 0.62 }),
          arrival({ id: 'pim', state: 'arrived' }),
          arrival({ id: 'lens', state: 'known' }),
          arrival({ id: 'notes', state: 'refused', reason: 'This is a text file: choose the photograph itself.' }),
        ]}
        onRetry={vi.fn()}
        onClear={vi.fn()}
      />,
    );
    const rows = within(screen.getByRole('list', { name: 'Files' })).getAllByRole('listitem').map((row) => row.textContent);
    expect(rows).toEqual([
      expect.stringContaining('This is a text file'),
      'gulls.jpg62%',
      'pim.jpghere',
      'lens.jpgalready here: nothing was added',
    ]);
    expect(screen.getByRole('progressbar', { name: 'gulls.jpg, arriving' })).toHaveAttribute('value', '0.62');
    expect(screen.getByRole('status')).toHaveTextContent('2 of 4 here, 1 not taken');
  });

  it('offers to send a file again that was not refused but lost', async () => {
    const retry = vi.fn();
    render(<ArrivalsList arrivals={[arrival({ id: 'pim', state: 'unsent', reason: 'No connection.' })]} onRetry={retry} onClear={vi.fn()} />);
    await userEvent.click(screen.getByRole('button', { name: 'Send again pim.jpg' }));
    expect(retry).toHaveBeenCalledExactlyOnceWith('pim');
  });
});
