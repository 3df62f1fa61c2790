import { useState } from 'react';
import { colorName } from '#shared/colour/name';
import { freeSheets, isLow, type StashSheet } from '#shared/model/stash';
import type { Unit } from '#shared/words/measure';
import { sheetCount } from '#shared/words/en/stash';
import { Button, IconButton } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { MoreIcon } from '@/components/icons';
import { useAnnounce } from '@/components/live-region';
import { Measure } from '@/components/measure';
import { Menu, MenuItem } from '@/components/menu';
import { Tag } from '@/components/tag';
import { useRemoveSheet, useUpdateSheet } from '../api/stash-mutations';
import { kindWords, priceText, sureness } from '../model/sheet-words';
import { SheetDialog } from './sheet-dialog';
import { SheetSwatch } from './sheet-swatch';

interface StashRowProps {
  readonly studioId: string;
  readonly sheet: StashSheet;
  readonly unit: Unit;
  readonly mayEdit: boolean;
  readonly isSelected: boolean;
  readonly onToggle: () => void;
  readonly onFail: (error: unknown) => void;
}

export function StashRow({ studioId, sheet, unit, mayEdit, isSelected, onToggle, onFail }: StashRowProps) {
  const [front] = sheet.sides;
  return (
    <tr data-chosen={isSelected || undefined}>
      {mayEdit && (
        <td className="is-check">
          <input type="checkbox" aria-label={`Choose ${sheet.name}`} checked={isSelected} onChange={onToggle} />
        </td>
      )}
      <th scope="row">
        <span className="sheet-name">
          <SheetSwatch sides={sheet.sides} />
          <span className="min-w-0">
            <b>{sheet.name}</b>
            <small>{[kindWords(sheet), sheet.maker].filter(Boolean).join(' · ')}</small>
          </span>
        </span>
      </th>
      <td className="is-colour">
        {sheet.sides.map(({ hex }) => colorName(hex)).join(' / ')}
        <small title={`Known to about ${front.uncertainty} by CIEDE2000`}>{sureness(front)}</small>
      </td>
      <td className="is-number is-size">
        <Measure unit={unit} of={sheet} />
      </td>
      <td className="is-number is-count">
        <OnHand studioId={studioId} sheet={sheet} mayEdit={mayEdit} onFail={onFail} />
      </td>
      <td className="is-number is-price num">{priceText(sheet.price)}</td>
      <td className="is-place">{sheet.place}</td>
      {mayEdit && (
        <td className="is-more">
          <RowMenu studioId={studioId} sheet={sheet} unit={unit} onFail={onFail} />
        </td>
      )}
    </tr>
  );
}

function OnHand({ studioId, sheet, mayEdit, onFail }: Pick<StashRowProps, 'studioId' | 'sheet' | 'mayEdit' | 'onFail'>) {
  const update = useUpdateSheet(studioId);
  const announce = useAnnounce();
  const set = (quantity: number): void =>
    update.mutate({ id: sheet.id, quantity }, { onSuccess: () => announce(`${sheet.name}: ${sheetCount(quantity)} on hand`), onError: onFail });
  const mark = freeSheets(sheet) === 0 ? 'none free' : 'low';
  return (
    <>
      <span className="on-hand">
        {mayEdit && (
          <IconButton
            label={`One sheet of ${sheet.name} fewer`}
            disabled={sheet.quantity <= sheet.reserved}
            title={sheet.quantity <= sheet.reserved ? 'All that are left are reserved' : undefined}
            onClick={() => set(sheet.quantity - 1)}
          >
            −
          </IconButton>
        )}
        <span className="num">{sheet.quantity}</span>
        {mayEdit && (
          <IconButton label={`One sheet of ${sheet.name} more`} onClick={() => set(sheet.quantity + 1)}>
            +
          </IconButton>
        )}
      </span>
      {(sheet.reserved > 0 || isLow(sheet)) && (
        <span className="on-hand-marks">
          {sheet.reserved > 0 && <Tag tone="pencil">{sheet.reserved} reserved</Tag>}
          {isLow(sheet) && <Tag tone="quiet">{mark}</Tag>}
        </span>
      )}
    </>
  );
}

function RowMenu({ studioId, sheet, unit, onFail }: Pick<StashRowProps, 'studioId' | 'sheet' | 'unit' | 'onFail'>) {
  const [asks, setAsks] = useState<'edit' | 'remove' | null>(null);
  const update = useUpdateSheet(studioId);
  const remove = useRemoveSheet(studioId);
  const close = (): void => setAsks(null);
  return (
    <>
      <Menu
        align="end"
        trigger={
          <IconButton label={`More for ${sheet.name}`}>
            <MoreIcon />
          </IconButton>
        }
      >
        <MenuItem onSelect={() => setAsks('edit')}>Edit</MenuItem>
        <MenuItem onSelect={() => setAsks('remove')} disabled={sheet.reserved > 0}>
          {sheet.reserved > 0 ? 'Reserved, so it stays' : 'Take off the list'}
        </MenuItem>
      </Menu>
      {asks === 'edit' && (
        <SheetDialog studioId={studioId} unit={unit} facts={sheet} title={sheet.name} action="Save" onSave={(facts) => update.mutateAsync({ id: sheet.id, ...facts })} onClose={close} />
      )}
      {asks === 'remove' && (
        <Dialog open onClose={close} title={`Take ${sheet.name} off the list?`} description={`${sheetCount(sheet.quantity)} and what is known of the colour are forgotten. Spreads keep their colours.`}>
          <div className="flex justify-end gap-2">
            <Button variant="bare" onClick={close}>
              Keep it
            </Button>
            <Button variant="ink" working={remove.isPending} onClick={() => remove.mutate(sheet.id, { onSuccess: close, onError: (error) => (close(), onFail(error)) })}>
              Take off
            </Button>
          </div>
        </Dialog>
      )}
    </>
  );
}
