import { describe, expect, it } from 'vitest';
import { oklchToHex } from '#shared/colour/css-color';
import { runChecks } from '#shared/checks/run-checks';
import { tooManyColors } from '#shared/checks/too-many-colors';
import { matIdOf } from '../../support/builders';
import { viewColored } from '../../support/colored-spread';

const hue = (degrees: number): string => oklchToHex([0.4, 0.09, degrees]);
const FOUR = [hue(0), hue(90), hue(180), hue(270)];

describe('too-many-colors', () => {
  it('notes a fifth colour, and speaks of the one of which there is least', () => {
    const view = viewColored([...FOUR, hue(0), hue(90), hue(180), hue(315)], FOUR);
    expect(tooManyColors.run(view)).toMatchObject([{ data: { count: 5, most: 4 }, matIds: [expect.any(String)] }]);
    const clear = viewColored([...FOUR, ...FOUR.slice(1), hue(315)], FOUR);
    const [found] = tooManyColors.run(clear);
    expect([matIdOf(1), matIdOf(8)]).toContain(found?.matIds[0]);
  });

  it('is content with four, with neutrals besides and with near shades of one', () => {
    expect(tooManyColors.run(viewColored([...FOUR, '#808080', '#ffffff', '#111111', hue(0)], FOUR))).toEqual([]);
    expect(tooManyColors.run(viewColored([...FOUR, oklchToHex([0.405, 0.09, 0])], FOUR))).toEqual([]);
  });

  it('goes by its threshold', () => {
    expect(tooManyColors.run(viewColored(FOUR, FOUR), { colors: 3 })).toHaveLength(1);
  });

  it('offers a colour that stays', () => {
    const view = viewColored([...FOUR, ...FOUR.slice(0, 3), hue(315)], FOUR);
    const note = runChecks(view).find(({ checkId }) => checkId === 'too-many-colors');
    expect(note?.remedy?.messageId).toBe('other-color');
    const stay = [...FOUR, hue(315)].filter((color) => color !== note?.data.color);
    expect(stay).toContain(note?.remedy?.messageId === 'other-color' ? note.remedy.data.color : null);
  });
});
