import { inches } from '../../../shared/model/length';
import { UNCERTAINTY, type StashFacts, type StashSide, type StashSides } from '../../../shared/model/stash';

const MAKER = 'Quern Lane Paper Mill';
const plain = (hex: string): StashSide => ({ hex, source: 'typed', uncertainty: UNCERTAINTY.typed, pattern: 'plain', palette: [] });

const sheets = (name: string, sides: StashSides, quantity: number, texture: string, place: string, more: Partial<StashFacts> = {}): StashFacts => ({
  name,
  maker: MAKER,
  texture,
  place,
  width: inches(12),
  height: inches(12),
  quantity,
  lowAt: 1,
  price: 95,
  sides,
  ...more,
});

/** The demo's drawer: nine cardstocks, and one patterned paper with two sides. */
export const DEMO_STASH: readonly StashFacts[] = [
  sheets('Oat', [plain('#efe6d2')], 4, 'linen', 'Drawer 1'),
  sheets('Harbour', [plain('#1d4f5c')], 2, 'smooth', 'Drawer 1'),
  sheets('Sea glass', [plain('#b9cfc4')], 3, 'smooth', 'Drawer 1'),
  sheets('Lamp', [plain('#dc9f33')], 1, 'smooth', 'Drawer 2'),
  sheets('Chalk', [plain('#f3f0e8')], 6, 'linen', 'Drawer 1'),
  sheets('Shingle', [plain('#a3a29b')], 3, 'felt', 'Drawer 2'),
  sheets('Slate', [plain('#515a62')], 2, 'smooth', 'Drawer 2'),
  sheets('Kelp', [plain('#5d6845')], 2, 'smooth', 'Drawer 2'),
  sheets('Buoy', [plain('#cf6a3c')], 0, 'smooth', 'Drawer 2'),
  sheets(
    'Deck chair',
    [
      { ...plain('#f3f0e8'), pattern: 'stripe', palette: ['#1d4f5c'] },
      { ...plain('#dc9f33'), pattern: 'dot', palette: ['#f3f0e8'] },
    ],
    2,
    'smooth',
    'Rack by the window',
    { price: 140 },
  ),
];
