import { colorName } from '#shared/colour/name';
import type { Hex } from '#shared/model/ids';

/** A colour and its name: never a colour alone. */
export const NamedSwatch = ({ color }: { color: Hex }) => (
  <>
    <i className="action-swatch" style={{ background: color }} /> {colorName(color)}
  </>
);
