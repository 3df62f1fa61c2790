import { useState, type FormEvent } from 'react';
import { inches, millimetres } from '#shared/model/length';
import type { StashFacts, StashSide, StashSides } from '#shared/model/stash';
import { formatLength, parseLength, type Unit } from '#shared/words/measure';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { TextField } from '@/components/field';
import { Notice } from '@/components/notice';
import { sentenceOf } from '@/lib/form-errors';
import { factsOf, PLAIN_SIDE, priceText, readCount, readPrice } from '../model/sheet-words';
import { SideFields } from './side-fields';

interface SheetDialogProps {
  readonly studioId: string;
  readonly unit: Unit;
  readonly facts: StashFacts;
  readonly title: string;
  readonly action: string;
  readonly onSave: (facts: StashFacts) => Promise<unknown>;
  readonly onClose: () => void;
}

type Texts = Readonly<Record<'name' | 'maker' | 'texture' | 'place' | 'width' | 'height' | 'quantity' | 'lowAt' | 'price', string>>;
type Faults = Partial<Record<keyof Texts, string>>;

const textsOf = (facts: StashFacts, unit: Unit): Texts => ({
  name: facts.name,
  maker: facts.maker,
  texture: facts.texture,
  place: facts.place,
  width: formatLength(facts.width, unit),
  height: formatLength(facts.height, unit),
  quantity: String(facts.quantity),
  lowAt: facts.lowAt === null ? '' : String(facts.lowAt),
  price: priceText(facts.price),
});

/** Everything that is known of a sheet. The same form adds and edits. */
export function SheetDialog({ studioId, unit, facts, title, action, onSave, onClose }: SheetDialogProps) {
  const [texts, setTexts] = useState(() => textsOf(facts, unit));
  const [sides, setSides] = useState<StashSides>(facts.sides);
  const [faults, setFaults] = useState<Faults>({});
  const [failure, setFailure] = useState<string | null>(null);
  const [isSaving, setIsSaving] = useState(false);
  const [front, back] = sides;

  const field = (key: keyof Texts) => ({
    value: texts[key],
    error: faults[key],
    maxLength: 80,
    autoComplete: 'off',
    onChange: ({ target }: { readonly target: { readonly value: string } }) => {
      setTexts({ ...texts, [key]: target.value });
      setFaults({ ...faults, [key]: undefined });
    },
  });

  const submit = async (event: FormEvent): Promise<void> => {
    event.preventDefault();
    event.stopPropagation();
    const read = readTexts(texts, facts, unit);
    if ('faults' in read) return setFaults(read.faults);
    setIsSaving(true);
    setFailure(null);
    try {
      await onSave({ ...read.facts, sides });
      onClose();
    } catch (error) {
      setFailure(sentenceOf(error));
      setIsSaving(false);
    }
  };

  const changeFront = (side: StashSide): void => setSides(back ? [side, back] : [side]);
  return (
    <Dialog open onClose={onClose} title={title} className="stash-dialog">
      <form onSubmit={(event) => void submit(event)} noValidate className="grid gap-4">
        {failure !== null && (
          <Notice alert className="bg-paper-2">
            {failure}
          </Notice>
        )}
        <div className="sheet-form">
          <TextField label="Name" {...field('name')} />
          <TextField label="Maker" {...field('maker')} />
          <TextField label="Texture" placeholder="smooth, linen, felt …" {...field('texture')} />
          <TextField label="Place" placeholder="Drawer 2" {...field('place')} />
        </div>
        <div className="sheet-numbers">
          <TextField label={`Width, ${unit}`} inputMode="text" {...field('width')} />
          <TextField label={`Height, ${unit}`} inputMode="text" {...field('height')} />
          <TextField label="Sheets" inputMode="numeric" {...field('quantity')} />
          <TextField label="Low at" inputMode="numeric" placeholder="never" {...field('lowAt')} />
          <TextField label="Price" inputMode="decimal" {...field('price')} />
        </div>
        <SideFields legend={back ? 'Front' : 'Colour'} studioId={studioId} side={front} onChange={changeFront} />
        {back ? (
          <SideFields legend="Back" studioId={studioId} side={back} onChange={(side) => setSides([front, side])} onRemove={() => setSides([front])} />
        ) : (
          <button type="button" className="link-button justify-self-start" onClick={() => setSides([front, PLAIN_SIDE])}>
            The back looks different
          </button>
        )}
        <div className="flex justify-end gap-2">
          <Button variant="bare" onClick={onClose}>
            Cancel
          </Button>
          <Button type="submit" variant="ink" working={isSaving}>
            {action}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}

/** What was typed, or what does not fit. A length that was not touched stays exactly as it was. */
function readTexts(texts: Texts, before: StashFacts, unit: Unit): { readonly facts: StashFacts } | { readonly faults: Faults } {
  const shown = textsOf(before, unit);
  const length = (key: 'width' | 'height') => (texts[key] === shown[key] ? before[key] : parseLength(texts[key], unit));
  const [width, height, quantity, price] = [length('width'), length('height'), readCount(texts.quantity), readPrice(texts.price)];
  const lowAt = texts.lowAt.trim() === '' ? null : readCount(texts.lowAt);
  const most = unit === 'in' ? inches(390) : millimetres(9999);
  const sizeFault = unit === 'in' ? 'Write 12 or 8 1/2.' : 'Write 305 or 297.';
  const isSize = (value: number | null): value is number => value !== null && value > 0 && value <= most;
  const faults: Faults = {
    ...(texts.name.trim() === '' && { name: 'Write a name first.' }),
    ...(!isSize(width) && { width: sizeFault }),
    ...(!isSize(height) && { height: sizeFault }),
    ...(quantity === undefined && { quantity: 'Write a count.' }),
    ...(lowAt === undefined && { lowAt: 'Write a count.' }),
    ...(price === undefined && { price: 'Write 1.25.' }),
  };
  if (Object.keys(faults).length > 0 || !isSize(width) || !isSize(height) || quantity === undefined || lowAt === undefined || price === undefined) return { faults };
  const line = (key: 'name' | 'maker' | 'texture' | 'place'): string => texts[key].trim();
  return { facts: { ...factsOf(before), name: line('name'), maker: line('maker'), texture: line('texture'), place: line('place'), width, height, quantity, lowAt, price } };
}
