import { useMemo, useRef, useState } from 'react';
import { MAX_CSV_BYTES } from '#shared/contracts/stash';
import { readStashCsv, STASH_COLUMNS } from '#shared/csv/stash-csv';
import { sheetCount } from '#shared/words/en/stash';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { Field } from '@/components/field';
import { useAnnounce } from '@/components/live-region';
import { Notice } from '@/components/notice';
import { sentenceOf } from '@/lib/form-errors';
import { newId } from '@/lib/ids';
import { useImportStash } from '../api/stash-mutations';
import { readTextFile } from '../model/read-file';

/** Faults that are listed at once; the rest are counted, and follow when these are mended. */
const SHOWN_FAULTS = 8;

interface ImportDialogProps {
  readonly studioId: string;
  readonly onClose: () => void;
}

/** Brings sheets in from a CSV file or pasted cells. Rows that do not fit stay in the field, to be mended and tried again. */
export function ImportDialog({ studioId, onClose }: ImportDialogProps) {
  const [text, setText] = useState('');
  const [importId, setImportId] = useState(newId);
  const [done, setDone] = useState<string | null>(null);
  const input = useRef<HTMLInputElement>(null);
  const bringIn = useImportStash(studioId);
  const announce = useAnnounce();
  const { rows, faults } = useMemo(() => (text.trim() === '' ? { rows: [], faults: [] } : readStashCsv(text)), [text]);
  const isTooLong = text.length > MAX_CSV_BYTES;

  const edit = (csv: string): void => {
    setText(csv);
    // Another text is another import; the same one sent again is not.
    setImportId(newId());
    bringIn.reset();
  };
  const send = async (): Promise<void> => {
    const answer = await bringIn.mutateAsync({ id: importId, csv: text });
    const words = [answer.added > 0 && `${answer.added} added`, answer.changed > 0 && `${answer.changed} changed`].filter(Boolean).join(', ') || 'Nothing taken';
    announce(words);
    if (answer.faults.length === 0) return onClose();
    setDone(words);
    edit([answer.heading, ...answer.faults.map((fault) => fault.text)].filter(Boolean).join('\n'));
  };
  return (
    <Dialog
      open
      onClose={onClose}
      title="Bring in sheets"
      description="A CSV file, or cells copied from a spreadsheet, with headings in its first line. Name and colour are needed; a file that was taken out of here can be changed and brought in again."
      className="stash-dialog"
    >
      <div className="grid gap-4">
        {done !== null && <Notice tone="note">{done}. The rows below did not fit: mend them and bring them in again.</Notice>}
        <div className="flex items-center gap-3">
          <Button variant={text === '' ? 'ink' : 'plain'} onClick={() => input.current?.click()}>
            Choose a file
          </Button>
          <span className="text-ink-2">or paste below</span>
        </div>
        <input
          ref={input}
          type="file"
          accept=".csv,.tsv,.txt,text/csv"
          className="hidden"
          aria-label="CSV file"
          tabIndex={-1}
          onChange={(event) => {
            const file = event.target.files?.[0];
            event.target.value = '';
            if (file) void readTextFile(file).then(edit);
          }}
        />
        <Field label="Rows" hint={`Headings: ${STASH_COLUMNS.slice(1, 12).join(', ')}`}>
          {(control) => (
            <textarea {...control} className="field-input csv-text" rows={7} spellCheck={false} wrap="off" value={text} placeholder={'name,colour,quantity\nOat,#efe6d2,4'} onChange={(event) => edit(event.target.value)} />
          )}
        </Field>
        {faults.length > 0 && (
          <div role="status" className="csv-faults">
            <p>
              {faults.length === 1 ? 'One row does' : `${faults.length} rows do`} not fit and will stay here:
            </p>
            <ul>
              {faults.slice(0, SHOWN_FAULTS).map(({ line, message }) => (
                <li key={line}>
                  <span className="num">Line {line}</span> {message}
                </li>
              ))}
              {faults.length > SHOWN_FAULTS && <li>and {faults.length - SHOWN_FAULTS} more</li>}
            </ul>
          </div>
        )}
        {isTooLong && <Notice alert>This is more than can be taken at once: bring it in as several files.</Notice>}
        {bringIn.error && <Notice alert>{sentenceOf(bringIn.error)}</Notice>}
        <div className="flex justify-end gap-2">
          <Button variant="bare" onClick={onClose}>
            {done === null ? 'Cancel' : 'Close'}
          </Button>
          <Button
            variant="ink"
            disabled={rows.length === 0 || isTooLong}
            title={rows.length === 0 ? 'There is no row yet that fits' : undefined}
            working={bringIn.isPending}
            onClick={() => void send().catch(() => undefined)}
          >
            {rows.length === 0 ? 'Bring in' : `Bring in ${sheetCount(rows.length).replace('sheet', 'row')}`}
          </Button>
        </div>
      </div>
    </Dialog>
  );
}
