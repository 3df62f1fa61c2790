import type { ReactNode } from 'react';
import { BIGGEST_SIZES, NINE_THIRDS, ORIENTATION_MIXES, type NineThird, type SketchFilter } from '#shared/sketches/features';

const COUNTS: readonly { label: string; least?: number; most?: number }[] = [
  { label: 'Any' },
  { label: '3–5', least: 3, most: 5 },
  { label: '6–8', least: 6, most: 8 },
  { label: '9–12', least: 9, most: 12 },
  { label: '13 up', least: 13 },
];
const SIZE_WORDS = { small: 'Small', medium: 'Medium', large: 'Large' } as const;
const MIX_WORDS = { flat: 'Mostly flat', upright: 'Mostly upright', mixed: 'Mixed', square: 'Square' } as const;

interface SketchFiltersProps {
  readonly filter: SketchFilter;
  readonly count: number;
  readonly total: number;
  readonly onChange: (filter: SketchFilter) => void;
}

/** Number of mats, biggest mat, orientation, panes. */
export function SketchFilters({ filter, count, total, onChange }: SketchFiltersProps) {
  const set = (change: Partial<SketchFilter>): void => onChange({ ...filter, ...change });
  return (
    <div className="match-filters">
      <Choice legend="Mats">
        {COUNTS.map(({ label, least, most }) => (
          <Option key={label} isOn={filter.leastMats === least && filter.mostMats === most} onPress={() => set({ leastMats: least, mostMats: most })}>
            {label}
          </Option>
        ))}
      </Choice>
      <Choice legend="Biggest mat">
        <Option isOn={filter.biggestSize === undefined} onPress={() => set({ biggestSize: undefined })}>
          Any
        </Option>
        {BIGGEST_SIZES.map((size) => (
          <Option key={size} isOn={filter.biggestSize === size} onPress={() => set({ biggestSize: size })}>
            {SIZE_WORDS[size]}
          </Option>
        ))}
        <PlaceChoice value={filter.biggestPlace} onChange={(biggestPlace) => set({ biggestPlace })} />
      </Choice>
      <Choice legend="Mats lie">
        <Option isOn={filter.orientation === undefined} onPress={() => set({ orientation: undefined })}>
          Any
        </Option>
        {ORIENTATION_MIXES.map((mix) => (
          <Option key={mix} isOn={filter.orientation === mix} onPress={() => set({ orientation: mix })}>
            {MIX_WORDS[mix]}
          </Option>
        ))}
      </Choice>
      <Choice legend="Panes">
        <Option isOn={filter.panes === undefined} onPress={() => set({ panes: undefined })}>
          Any
        </Option>
        <Option isOn={filter.panes === true} onPress={() => set({ panes: true })}>
          With a split print
        </Option>
        <Option isOn={filter.panes === false} onPress={() => set({ panes: false })}>
          Without
        </Option>
      </Choice>
      <p className="num match-count" role="status">
        {count} of {total} sketches
      </p>
    </div>
  );
}

const Choice = ({ legend, children }: { legend: string; children: ReactNode }) => (
  <fieldset>
    <legend>{legend}</legend>
    {children}
  </fieldset>
);

const Option = ({ isOn, onPress, children }: { isOn: boolean; onPress: () => void; children: ReactNode }) => (
  <button type="button" className="opt" aria-pressed={isOn} onClick={onPress}>
    {children}
  </button>
);

/** The nine thirds of a page as nine small squares: where the biggest mat lies. Pressing the chosen one again lets any place count. */
function PlaceChoice({ value, onChange }: { value: NineThird | undefined; onChange: (place: NineThird | undefined) => void }) {
  return (
    <span className="place-choice" role="group" aria-label="Where the biggest mat lies">
      {NINE_THIRDS.map((place) => (
        <button key={place} type="button" aria-label={place.replace('-', ' ')} title={place.replace('-', ' ')} aria-pressed={value === place} onClick={() => onChange(value === place ? undefined : place)} />
      ))}
    </span>
  );
}
