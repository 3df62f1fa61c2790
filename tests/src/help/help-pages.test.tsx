import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Route, Routes } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { CHECK_IDS } from '#shared/checks/check-ids';
import { CHECK_HELP } from '#shared/words/en/check-help';
import { Component as HelpPage } from '@/routes/help';
import { Component as CheckHelpPage } from '@/routes/help-check';
import { Component as WeightHelpPage } from '@/routes/help-weight';
import { renderInApp } from '../../support/render-app';

const open = (at: string) =>
  renderInApp(
    <Routes>
      <Route path="help" element={<HelpPage />} />
      <Route path="help/weight" element={<WeightHelpPage />} />
      <Route path="help/checks/:checkId" element={<CheckHelpPage />} />
    </Routes>,
    { at },
  );

describe('the page of a check', () => {
  it.each(CHECK_IDS)('%s: draws both spreads without fetching a picture, and says what the note would say', (id) => {
    const { container } = open(`/help/checks/${id}`);
    expect(screen.getByRole('heading', { level: 1, name: CHECK_HELP[id].name })).toBeInTheDocument();
    const wrong = screen.getByRole('img', { name: /^Wrong: \S.*\.$/ });
    const right = screen.getByRole('img', { name: `Right: ${CHECK_HELP[id].right}` });
    expect(wrong.querySelectorAll('[data-mat]').length).toBeGreaterThan(0);
    expect(wrong.innerHTML).not.toBe(right.innerHTML);
    expect(container.querySelector('image, img')).toBeNull();
    expect(right.querySelector('.help-noted')).toBeNull();
  });

  it('says where a measure is published, and what may be set in both units', () => {
    open('/help/checks/photo-sinks');
    expect(screen.getByText(/^A published measure: CIEDE2000/)).toBeInTheDocument();
    expect(screen.getByText('33 %')).toBeInTheDocument();
  });

  it('leads on to the next check and back to all of them', async () => {
    open(`/help/checks/${CHECK_IDS[0]}`);
    const others = screen.getByRole('navigation', { name: 'Other checks' });
    await userEvent.click(within(others).getByRole('link', { name: new RegExp(CHECK_HELP[CHECK_IDS[1]].name) }));
    expect(screen.getByRole('heading', { level: 1, name: CHECK_HELP[CHECK_IDS[1]].name })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('link', { name: 'All checks' }));
    expect(screen.getByRole('heading', { level: 1, name: 'Help' })).toBeInTheDocument();
  });

  it('of a check that there is not says so', () => {
    open('/help/checks/no-such-check');
    expect(screen.getByRole('heading', { name: 'Nothing lies here' })).toBeInTheDocument();
  });
});

describe('the index', () => {
  it('links to every check', () => {
    open('/help');
    for (const id of CHECK_IDS) expect(screen.getByRole('link', { name: CHECK_HELP[id].name })).toHaveAttribute('href', `/help/checks/${id}`);
  });

  it('finds checks by words of their pages, in any order, and says when there are none', async () => {
    open('/help');
    await userEvent.type(screen.getByRole('searchbox', { name: 'Find' }), 'caustic instant');
    expect(screen.getByText('1 check')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: CHECK_HELP['never-cut'].name })).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: CHECK_HELP['no-title'].name })).not.toBeInTheDocument();
    await userEvent.type(screen.getByRole('searchbox', { name: 'Find' }), ' zebra');
    expect(screen.getByText(/^No check speaks of all of these words/)).toBeInTheDocument();
  });
});

describe('the page on weight', () => {
  it('gives every measure with its formula', () => {
    open('/help/weight');
    expect(screen.getByText('Deviation of the centre')).toBeInTheDocument();
    expect(screen.getByText('3 / (left edges + top edges + n)')).toBeInTheDocument();
  });
});
