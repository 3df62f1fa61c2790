import { toPaper } from '#shared/geometry/paper';
import { toInches, UNITS_PER_INCH } from '#shared/model/length';
import type { Print } from '#shared/model/print';
import type { TrimSettings } from '#shared/model/spread';
import { formatSize, type Unit } from '#shared/words/measure';
import { PrintPicture } from '@/components/print-picture';
import { useWidth } from '@/lib/use-width';
import type { PrintChange } from '../api/print-mutations';
import { middleZone, toPxRect } from '../model/zone-edit';
import { KeepZoneEditor } from './keep-zone-editor';
import { PaperRulers } from './paper-rulers';

interface BigPrintProps {
  readonly print: Print;
  readonly unit: Unit;
  readonly trim: TrimSettings;
  readonly mayEdit: boolean;
  readonly onSave: (change: PrintChange) => void;
}

/** The most room for the opened print, in px. */
const ROOM = { width: 452, height: 468 };

/** The opened print as large as there is room, with a ruler along two edges and its keep zone on it. */
export function BigPrint({ print, unit, trim, mayEdit, onSave }: BigPrintProps) {
  const [width, room] = useWidth<HTMLDivElement>(ROOM.width);
  const pxPerInch = Math.min(Math.min(width, ROOM.width) / toInches(print.paperWidth), ROOM.height / toInches(print.paperHeight));
  const pxPerLength = pxPerInch / UNITS_PER_INCH;
  const zone = print.keepZone && toPaper(print, print.keepZone);
  const paper = { width: print.paperWidth, height: print.paperHeight };
  return (
    <div className="mb-4">
      <div className="big-print">
        <div ref={room} aria-hidden="true" />
        <div className="relative" style={{ width: paper.width * pxPerLength }}>
          <PrintPicture print={print} pxPerInch={pxPerInch} pictureSize="large" />
          <PaperRulers paper={paper} unit={unit} pxPerLength={pxPerLength} />
          <KeepZoneEditor
            zone={zone}
            paper={paper}
            unit={unit}
            pxPerLength={pxPerLength}
            step={trim.finestMark}
            mayEdit={mayEdit}
            onSave={(rect) => onSave({ keepZone: toPxRect(print, rect) })}
          />
        </div>
      </div>
      <div className="mt-3 flex min-h-8 flex-wrap items-center gap-x-2 gap-y-1 text-13">
        <span className="text-ink-2">Keep zone</span>
        {zone === null ? (
          <span>{mayEdit ? 'none: draw one on the print, round what trimming must not touch' : 'none'}</span>
        ) : (
          <span className="num">{formatSize(zone, unit)}</span>
        )}
        {mayEdit && zone === null && (
          <button type="button" className="opt" onClick={() => onSave({ keepZone: toPxRect(print, middleZone(paper)) })}>
            Put one in the middle
          </button>
        )}
        {mayEdit && zone !== null && (
          <button type="button" className="opt" onClick={() => onSave({ keepZone: null })}>
            Clear
          </button>
        )}
        {mayEdit && zone !== null && (
          <span className="w-full text-12 text-ink-2">
            Drag it, or use arrows; <kbd>Shift</kbd> goes further, <kbd>Alt</kbd> pulls its right and lower edge.
          </span>
        )}
      </div>
    </div>
  );
}
