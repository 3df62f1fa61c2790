import { colorName } from '#shared/colour/name';
import type { Swatch } from '#shared/model/print';
import { Fact } from './fact';

/** A print's colours, each as wide as its share of the picture, with their names in words. */
export function PaletteStrip({ palette }: { readonly palette: readonly Swatch[] }) {
  return (
    <Fact label="Colours" className="flex-col items-stretch! gap-1!">
      {palette.length === 0 ? (
        <span className="text-ink-2">None were found.</span>
      ) : (
        <ul className="hues">
          {palette.map(({ hex, share }) => (
            <li key={hex} style={{ backgroundColor: hex, flexGrow: Math.max(share, 0.06) }} title={`${colorName(hex)}, ${percent(share)}`}>
              <span className="sr-only">
                {colorName(hex)}, {percent(share)}
              </span>
            </li>
          ))}
        </ul>
      )}
      <span className="text-12 text-ink-2" aria-hidden="true">
        {palette.slice(0, 4).map(({ hex }) => colorName(hex)).join(', ')}
      </span>
    </Fact>
  );
}

const percent = (share: number): string => (share < 0.01 ? 'under 1%' : `${Math.round(share * 100)}%`);
