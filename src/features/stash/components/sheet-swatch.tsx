import { colorName } from '#shared/colour/name';
import type { StashSide, StashSides } from '#shared/model/stash';

/** A corner of the sheet: its front, and its back where that looks different, folded over. Decoration; the words stand beside it. */
export function SheetSwatch({ sides }: { readonly sides: StashSides }) {
  const [front, back] = sides;
  return (
    <span className="sheet-swatch" aria-hidden="true" title={colorName(front.hex)}>
      <Face side={front} />
      {back && <Face side={back} isBack />}
    </span>
  );
}

function Face({ side, isBack = false }: { readonly side: StashSide; readonly isBack?: boolean }) {
  const over = side.palette[0] ?? '#23272f';
  return <i data-pattern={side.pattern} data-back={isBack || undefined} style={{ '--ground': side.hex, '--over': over } as React.CSSProperties} />;
}
