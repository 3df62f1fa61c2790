import { describe, expect, it } from 'vitest';
import { colorInNoPhoto } from '#shared/checks/color-in-no-photo';
import { oklchToHex } from '#shared/colour/css-color';
import { runChecks } from '#shared/checks/run-checks';
import { matIdOf, printIdOf } from '../../support/builders';
import { schemeOf, viewColored } from '../../support/colored-spread';

/** Card and photo colours by hue alone. */
const hue = (degrees: number, lightness = 0.6): string => oklchToHex([lightness, 0.09, degrees]);
const BLUE = hue(240);
const GREY = '#808080';

describe('color-in-no-photo', () => {
  it('notes card whose hue no photo has, and names all its mats', () => {
    const cards = [BLUE, BLUE, hue(30), hue(30), BLUE, BLUE, BLUE, GREY];
    expect(colorInNoPhoto.run(viewColored(cards, [BLUE, GREY]))).toMatchObject([{ data: { color: hue(30) }, matIds: [matIdOf(3), matIdOf(4)] }]);
  });

  it('does not mind another tone of a photo’s hue, nor neutrals', () => {
    expect(colorInNoPhoto.run(viewColored([hue(240, 0.35), GREY, '#ffffff'], [BLUE]))).toEqual([]);
  });

  it('turns over at 30 degrees', () => {
    expect(colorInNoPhoto.run(viewColored([hue(268)], [BLUE]))).toEqual([]);
    expect(colorInNoPhoto.run(viewColored([hue(274)], [BLUE]))).toHaveLength(1);
    expect(colorInNoPhoto.run(viewColored([hue(274)], [BLUE]), { hue: 60 })).toEqual([]);
  });

  it('says nothing about black and white photos, nor about a scheme’s colour taken from one that is placed', () => {
    expect(colorInNoPhoto.run(viewColored([BLUE], [GREY, '#222222']))).toEqual([]);
    const taken = schemeOf('echo', ['#ffffff', hue(30), BLUE, BLUE], [printIdOf(1)]);
    expect(colorInNoPhoto.run(viewColored([hue(30)], [BLUE], { scheme: taken }))).toEqual([]);
    const other = schemeOf('echo', ['#ffffff', hue(30), BLUE, BLUE], [printIdOf(99)]);
    expect(colorInNoPhoto.run(viewColored([hue(30)], [BLUE], { scheme: other }))).toHaveLength(1);
  });

  it('is off under lift, which brings such a colour in on purpose, and offers a colour of the photos otherwise', () => {
    const cards = [BLUE, BLUE, BLUE, BLUE, BLUE, BLUE, BLUE, hue(30)];
    const found = (character: 'lift' | 'echo') =>
      runChecks(viewColored(cards, [BLUE], { scheme: schemeOf(character, ['#ffffff', BLUE, BLUE, hue(30)]) })).find(({ checkId }) => checkId === 'color-in-no-photo');
    expect(found('lift')).toBeUndefined();
    expect(found('echo')?.remedy).toMatchObject({ messageId: 'other-color', call: { args: { matIds: [matIdOf(8)] } } });
  });
});
