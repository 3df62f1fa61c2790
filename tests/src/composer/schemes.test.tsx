import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { hexToOklab } from '#shared/colour/convert';
import { suggestPlaced } from '#shared/colour/suggest-placed';
import { visionFilterValues } from '#shared/colour/vision';
import { TRIM_SETTINGS_INCH } from '#shared/model/trim-settings';
import { ComposeScreen } from '@/features/composer/components/compose-screen';
import { ComposerProvider } from '@/features/composer/hooks/composer-context';
import { buildMat, buildPrint, buildRaster, buildSpread, matIdOf, printContent, printIdOf, printsById } from '../../support/builders';
import { openTab, type Tab } from '../../support/composer';
import { renderInApp } from '../../support/render-app';

const bands = (n: number, title: string, ...hexes: string[]) =>
  buildPrint({ id: printIdOf(n), title, raster: buildRaster(48, 32, (x) => hexToOklab(hexes[Math.floor((x * hexes.length) / 48)]!)) });
const sea = bands(1, 'The sea', '#1f4e5f', '#2d6f86', '#e8e2d4');
const buoy = bands(2, 'The buoy', '#e04f26', '#e8e2d4', '#2d6f86');
const doc = buildSpread({
  mats: [
    buildMat({ id: matIdOf(1), w: 8, h: 6, color: '#515a62', content: printContent(sea) }),
    buildMat({ id: matIdOf(2), page: 'right', x: 8, w: 8, h: 6, color: '#515a62', content: printContent(buoy) }),
  ],
});
const prints = [sea, buoy];
const lift = suggestPlaced({ doc, prints: printsById(prints), trim: TRIM_SETTINGS_INCH })[2]!;

function show(tab: Tab) {
  return renderInApp(
    <ComposerProvider value={tab.store}>
      <ComposeScreen title="Out to the light" piles={[]} mayEdit sortHref="/sort" />
    </ComposerProvider>,
  );
}

const pageFill = (): string | null | undefined => document.querySelector('[data-page="left"]')?.getAttribute('fill');
/** jsdom leaves out the space before a hidden word. */
const button = (...words: readonly [string, string]): Promise<HTMLElement> => screen.findByRole('button', { name: new RegExp(`^${words.join(' ?')}$`) }, { timeout: 4000 });

describe('the scheme fan', () => {
  it('shows the spread in a scheme while its button is held, and changes nothing', async () => {
    const tab = openTab({ doc, prints });
    show(tab);
    const look = await button('Look', 'at Lift');
    fireEvent.pointerDown(look, { button: 0 });
    expect(pageFill()).toBe(lift.args.pageColor);
    expect(screen.getByText('Lift, not in use')).toBeInTheDocument();
    fireEvent.pointerUp(look);
    expect(pageFill()).toBe('#ffffff');
    expect(tab.store.getState()).toMatchObject({ doc, canUndo: false });
  });

  it('does the same for Space, and for a press that holds nothing', async () => {
    show(openTab({ doc, prints }));
    const look = await button('Look', 'at Lift');
    look.focus();
    fireEvent.keyDown(look, { key: ' ' });
    expect(look).toHaveAttribute('aria-pressed', 'true');
    expect(pageFill()).toBe(lift.args.pageColor);
    fireEvent.keyUp(look, { key: ' ' });
    expect(pageFill()).toBe('#ffffff');
    fireEvent.click(look, { detail: 0 });
    expect(pageFill()).toBe(lift.args.pageColor);
    fireEvent.click(look, { detail: 0 });
    expect(pageFill()).toBe('#ffffff');
  });

  it('uses a scheme in one undo step, and then shows while held what was before', async () => {
    const tab = openTab({ doc, prints });
    show(tab);
    await userEvent.click(await button('Use', 'Lift'));
    await waitFor(() => expect(tab.store.getState().doc.scheme).toEqual(lift.scheme));
    expect(tab.store.getState().doc.mats.map(({ id, color }) => [id, color])).toEqual(doc.mats.map(({ id }) => [id, lift.args.matColors[id]]));
    const before = await button('Before', 'Lift');
    fireEvent.pointerDown(before, { button: 0 });
    expect(pageFill()).toBe('#ffffff');
    fireEvent.pointerLeave(before);
    expect(pageFill()).toBe(lift.args.pageColor);
    tab.store.getState().undo();
    expect(tab.store.getState().doc.scheme).toBeNull();
    expect(await button('Look', 'at Lift')).toBeInTheDocument();
  });

  it('places a scheme on the spread as it is when it is used, not as it was when it was suggested', async () => {
    const tab = openTab({ doc, prints });
    show(tab);
    const use = await button('Use', 'Lift');
    tab.store.getState().run({ id: 'mats.add', args: { page: 'left', x: 0, y: 8, w: 4, h: 4 } });
    fireEvent.click(use);
    await waitFor(() => expect(tab.store.getState().doc.scheme).not.toBeNull());
    const known = Object.values(lift.scheme.colors).map(({ hex }) => hex);
    expect(tab.store.getState().doc.mats).toHaveLength(3);
    for (const { color } of tab.store.getState().doc.mats) expect(known).toContain(color);
  });

  it('outlines the prints that a colour comes from, on focus', async () => {
    show(openTab({ doc, prints }));
    const chip = (await screen.findAllByRole('button', { name: /accent, .*from The buoy$/ }, { timeout: 4000 }))[0]!;
    const marked = (): string[] => [...document.querySelectorAll('.mat-control.is-marked')].map((mat) => mat.getAttribute('aria-label')!);
    expect(marked()).toEqual([]);
    fireEvent.focus(chip);
    expect(marked()).toEqual([expect.stringContaining('The buoy')]);
    fireEvent.blur(chip);
    expect(marked()).toEqual([]);
  });
});

describe('the spread as others see it', () => {
  it('filters the drawing by the published matrix in linear light, and nothing else', async () => {
    show(openTab({ doc, prints }));
    await userEvent.selectOptions(screen.getByLabelText('Seen as'), 'deuteranopia');
    const view = document.querySelector<HTMLElement>('[data-seen-as="deuteranopia"]')!;
    const filter = view.querySelector('filter')!;
    expect(filter.querySelector('feColorMatrix')).toHaveAttribute('values', visionFilterValues('deuteranopia'));
    expect(filter).toHaveAttribute('color-interpolation-filters', 'linearRGB');
    expect(view).toContainElement(document.querySelector('[data-page="left"]'));
    expect(within(view).queryAllByRole('button')).toEqual([]);
    await userEvent.selectOptions(screen.getByLabelText('Seen as'), 'common');
    expect(document.querySelector('[data-seen-as]')).toBeNull();
  });
});
