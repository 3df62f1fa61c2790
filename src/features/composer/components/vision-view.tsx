import type { ReactNode } from 'react';
import { VISIONS, visionFilterValues, type Vision } from '#shared/colour/vision';

export type SeenAs = 'common' | Vision;

const VISION_WORDS: Record<SeenAs, string> = {
  common: 'All colours',
  protanopia: 'Protanopia (no red cones)',
  deuteranopia: 'Deuteranopia (no green cones)',
  tritanopia: 'Tritanopia (no blue cones)',
};
const SOURCE = 'Simulated after Machado, Oliveira and Fernandes (2009), severity 1. It changes only the drawing on the table.';

/** Chooses whose eyes the drawn spread is seen with. */
export function VisionChoice({ value, width, onChange }: { value: SeenAs; width: number; onChange: (value: SeenAs) => void }) {
  return (
    <label className="vision-choice" title={SOURCE} style={{ width }}>
      <span>Seen as</span>
      <select value={value} onChange={(event) => onChange(event.target.value as SeenAs)}>
        {(['common', ...VISIONS] as const).map((vision) => (
          <option key={vision} value={vision}>
            {VISION_WORDS[vision]}
          </option>
        ))}
      </select>
    </label>
  );
}

/** Its children as they are seen that way. Controls and notes stay outside. */
export function VisionView({ seenAs, children }: { seenAs: SeenAs; children: ReactNode }) {
  if (seenAs === 'common') return <div className="vision-view">{children}</div>;
  const id = `seen-as-${seenAs}`;
  return (
    <div className="vision-view" data-seen-as={seenAs} style={{ filter: `url(#${id})` }}>
      {children}
      <svg className="vision-filter" aria-hidden="true" focusable="false">
        <filter id={id} colorInterpolationFilters="linearRGB" x="0" y="0" width="1" height="1">
          <feColorMatrix type="matrix" values={visionFilterValues(seenAs)} />
        </filter>
      </svg>
    </div>
  );
}
