import { inches, millimetres } from '#shared/model/length';
import type { Mat, SpreadDocument } from '#shared/model/spread';
import type { CommandCall } from '#shared/commands/calls';
import { inkOn } from '#shared/colour/contrast';
import { colorName } from '#shared/colour/name';
import { formatLength, type Unit } from '#shared/words/measure';
import { useComposer } from '@/features/composer/hooks/composer-context';
import { useRun } from '@/features/composer/hooks/use-run';
import { colorGroups } from '@/features/composer/model/color-groups';
import { LazyColorSheet } from './lazy-color-sheet';
import { NamedSwatch } from './named-swatch';
import { ContentSheet } from './content-sheet';
import { ActionPopover } from './popover';

interface MatActionsProps {
  readonly mats: readonly Mat[];
  readonly unit: Unit;
  readonly onDone: () => void;
}

/** What can be done with the selected mats, in a strip close to them. */
export function MatActions({ mats, unit, onDone }: MatActionsProps) {
  const run = useRun();
  const doc = useComposer((state) => state.doc);
  const prints = useComposer((state) => state.prints);
  const first = mats[0];
  if (!first) return null;
  const matIds = mats.map((mat) => mat.id);
  const isOne = mats.length === 1;
  const print = first.content.kind === 'print' ? prints.get(first.content.printId) : undefined;
  const group = first.content.kind === 'pane' ? doc.panes.find((panes) => panes.matIds.includes(first.id)) : undefined;
  return (
    <div className="mat-actions" role="toolbar" aria-label={isOne ? 'Mat' : `${mats.length} mats`}>
      <ActionPopover label={<NamedSwatch color={first.color} />} name={`Colour, ${colorName(first.color)}`}>
        <LazyColorSheet heading="Mat colour" value={first.color} groups={colorGroups(doc, prints)} onChoose={(color) => run({ id: 'mats.setColor', args: { matIds, color } })} />
      </ActionPopover>
      {isOne && !group && (
        <ActionPopover label="Carry">
          <ContentSheet key={`${first.id}/${first.content.kind}`} mat={first} unit={unit} ink={inkOn(first.color)} onChange={(content) => run({ id: 'mats.setContent', args: { matId: first.id, content } })} />
        </ActionPopover>
      )}
      <ActionPopover label="Reveal">
        <RevealSheet mats={mats} doc={doc} unit={unit} onRun={run} />
      </ActionPopover>
      {isOne && print && first.content.kind === 'print' && (
        <>
          <button
            type="button"
            className="mat-action"
            aria-pressed={first.content.mode === 'whole'}
            onClick={() => run({ id: 'placement.setWhole', args: { matId: first.id, whole: first.content.kind === 'print' && first.content.mode !== 'whole' } })}
          >
            Whole
          </button>
          {print.marks.noUp && (
            <button type="button" className="mat-action" onClick={() => run({ id: 'placement.turn', args: { matId: first.id, turn: nextTurn(first) } })}>
              Turn print
            </button>
          )}
          <button type="button" className="mat-action" onClick={() => run({ id: 'prints.lift', args: { matIds } })}>
            To the table
          </button>
        </>
      )}
      {group && (
        <>
          <button
            type="button"
            className="mat-action"
            aria-pressed={group.content?.run === 'apart'}
            disabled={!group.content}
            title={group.content ? 'Apart: nothing of the picture is lost. Behind: the gaps swallow some of it.' : 'Put a print on the panes first'}
            onClick={() => run({ id: 'panes.setRun', args: { groupId: group.id, run: group.content?.run === 'apart' ? 'behind' : 'apart' } })}
          >
            {group.content?.run === 'apart' ? 'Spread apart' : 'Runs on behind'}
          </button>
          <button type="button" className="mat-action" onClick={() => run({ id: 'panes.ungroup', args: { groupId: group.id } })}>
            Ungroup
          </button>
        </>
      )}
      {isOne ? (
        <ActionPopover label="Split">
          <SplitSheet mat={first} onRun={run} />
        </ActionPopover>
      ) : (
        <>
          <button type="button" className="mat-action" onClick={() => run({ id: 'mats.merge', args: { matIds } })}>
            Merge
          </button>
          <button type="button" className="mat-action" onClick={() => run({ id: 'panes.group', args: { matIds, printId: null } })}>
            Panes
          </button>
        </>
      )}
      <ActionPopover label="More" align="end">
        <MoreSheet mats={mats} onRun={run} onDone={onDone} />
      </ActionPopover>
    </div>
  );
}

const nextTurn = (mat: Mat): 0 | 1 | 2 | 3 => (mat.content.kind === 'print' ? (((mat.content.turn + 1) % 4) as 0 | 1 | 2 | 3) : 0);

interface SheetProps {
  readonly onRun: (call: CommandCall) => boolean;
}

function RevealSheet({ mats, doc, unit, onRun }: SheetProps & { mats: readonly Mat[]; doc: SpreadDocument; unit: Unit }) {
  const matIds = mats.map((mat) => mat.id);
  const reveals = unit === 'in' ? [0, inches(1 / 16), inches(1 / 8), inches(3 / 16), inches(1 / 4)] : [0, millimetres(2), millimetres(3), millimetres(5), millimetres(7)];
  const first = mats[0]!;
  const inner = first.inner ?? { color: '#f7f4ea', reveal: inches(1 / 16) };
  return (
    <div className="content-sheet">
      <h2>Reveal</h2>
      <p className="content-hint">The border of mat left visible round what it carries.</p>
      <div className="content-choices" role="group" aria-label="Reveal">
        <button type="button" className="opt" aria-pressed={first.reveal === null} onClick={() => onRun({ id: 'mats.setReveal', args: { matIds, reveal: null } })}>
          As the spread ({formatLength(doc.reveal, unit)})
        </button>
        {reveals.map((reveal) => (
          <button key={reveal} type="button" className="opt num" aria-pressed={first.reveal === reveal} onClick={() => onRun({ id: 'mats.setReveal', args: { matIds, reveal } })}>
            {reveal === 0 ? 'none' : `${formatLength(reveal, unit)} ${unit}`}
          </button>
        ))}
      </div>
      <h2>Inner mat</h2>
      <div className="content-choices">
        <button type="button" className="opt" aria-pressed={first.inner === null} onClick={() => onRun({ id: 'mats.setInner', args: { matIds, inner: null } })}>
          None
        </button>
        {['#f7f4ea', '#ffffff', '#23272f'].map((color) => (
          <button
            key={color}
            type="button"
            className="opt"
            aria-pressed={first.inner?.color === color}
            onClick={() => onRun({ id: 'mats.setInner', args: { matIds, inner: { ...inner, color } } })}
          >
            <i className="action-swatch" style={{ background: color }} /> {color === '#f7f4ea' ? 'Cream' : color === '#ffffff' ? 'White' : 'Ink'}
          </button>
        ))}
      </div>
    </div>
  );
}

function SplitSheet({ mat, onRun }: SheetProps & { mat: Mat }) {
  const options = [
    [2, 1],
    [1, 2],
    [3, 1],
    [1, 3],
    [4, 1],
    [2, 2],
    [3, 2],
    [3, 3],
  ] as const;
  const isPrint = mat.content.kind === 'print';
  return (
    <div className="content-sheet">
      <h2>Split</h2>
      <p className="content-hint">{isPrint ? 'The print is cut into panes, one on each small mat.' : 'Into equal small mats.'}</p>
      <div className="content-choices" role="group" aria-label="Columns and rows">
        {options.map(([columns, rows]) => {
          const fits = mat.w % columns === 0 && mat.h % rows === 0;
          return (
            <button
              key={`${columns}/${rows}`}
              type="button"
              className="opt num"
              disabled={!fits}
              title={fits ? `${columns} across, ${rows} down` : `This mat is ${mat.w} × ${mat.h} steps, which ${columns} × ${rows} does not divide`}
              onClick={() => onRun({ id: 'mats.split', args: { matId: mat.id, columns, rows } })}
            >
              {columns} × {rows}
            </button>
          );
        })}
      </div>
    </div>
  );
}

function MoreSheet({ mats, onRun, onDone }: SheetProps & { mats: readonly Mat[]; onDone: () => void }) {
  const matIds = mats.map((mat) => mat.id);
  const first = mats[0]!;
  const isOne = mats.length === 1;
  const row = (label: string, call: CommandCall, pressed?: boolean) => (
    <button key={label} type="button" className="sheet-row" aria-pressed={pressed} onClick={() => onRun(call)}>
      {label}
    </button>
  );
  return (
    <div className="content-sheet is-rows">
      {isOne && row('Focal: the eye lands here first', { id: 'mats.setFocal', args: { matId: first.id, focal: !first.focal } }, first.focal)}
      {row('Laid over other mats', { id: 'mats.setLaidOver', args: { matIds, laidOver: !first.laidOver } }, first.laidOver)}
      {isOne && row('Duplicate', { id: 'mats.duplicate', args: { matId: first.id } })}
      {isOne && row('Turn mat', { id: 'mats.turn', args: { matId: first.id } })}
      {!isOne && row('Mirror left to right', { id: 'mats.mirror', args: { matIds, axis: 'horizontal' } })}
      {!isOne && row('Mirror top to bottom', { id: 'mats.mirror', args: { matIds, axis: 'vertical' } })}
      <button
        type="button"
        className="sheet-row"
        onClick={() => {
          onRun({ id: 'mats.delete', args: { matIds } });
          onDone();
        }}
      >
        Delete {isOne ? 'mat' : 'mats'}
      </button>
    </div>
  );
}
