import { useEffect, useRef, useState } from 'react';
import { colorName } from '#shared/colour/name';
import type { Reference } from '#shared/colour/white-balance';
import type { ColorReading, Mark } from '#shared/contracts/stash';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { Notice } from '@/components/notice';
import { sentenceOf } from '@/lib/form-errors';
import { useReadColor } from '../api/stash-mutations';
import { sureness } from '../model/sheet-words';
import { PhotoMark } from './photo-mark';

const ACCEPTED = 'image/jpeg,image/png,image/webp,image/avif';
const PATCH_WORDS: Readonly<Record<Reference, string>> = { white: 'White paper', grey: 'Grey card' };

interface ColorReadingDialogProps {
  readonly studioId: string;
  readonly onClose: () => void;
  readonly onRead: (reading: ColorReading) => void;
}

/** Reads a sheet's colour from a photo of it beside something white or grey, which tells what the light was. */
export function ColorReadingDialog({ studioId, onClose, onRead }: ColorReadingDialogProps) {
  const [file, setFile] = useState<File | null>(null);
  const input = useRef<HTMLInputElement>(null);
  return (
    <Dialog
      open
      onClose={onClose}
      title="Read a colour from a photo"
      description="Photograph the sheet beside white paper or a grey card, both flat in the same even light, without flash or shadow. The photo is measured and not kept."
      className="stash-dialog"
    >
      {file ? (
        <MarkedPhoto key={`${file.name} ${file.lastModified}`} studioId={studioId} file={file} onOther={() => input.current?.click()} onRead={onRead} />
      ) : (
        <Button variant="ink" onClick={() => input.current?.click()}>
          Choose a photo
        </Button>
      )}
      <input
        ref={input}
        type="file"
        accept={ACCEPTED}
        className="hidden"
        aria-label="Photo of the sheet"
        tabIndex={-1}
        onChange={(event) => {
          setFile(event.target.files?.[0] ?? file);
          event.target.value = '';
        }}
      />
    </Dialog>
  );
}

interface MarkedPhotoProps {
  readonly studioId: string;
  readonly file: File;
  readonly onOther: () => void;
  readonly onRead: (reading: ColorReading) => void;
}

function MarkedPhoto({ studioId, file, onOther, onRead }: MarkedPhotoProps) {
  const url = useObjectUrl(file);
  const [ratio, setRatio] = useState(1);
  const [sheet, setSheet] = useState<Mark>({ x: 0.3, y: 0.5 });
  const [patch, setPatch] = useState<Mark>({ x: 0.8, y: 0.5 });
  const [reference, setReference] = useState<Reference>('white');
  const [isUnseen, setIsUnseen] = useState(false);
  const reading = useReadColor(studioId);
  const move = (set: (mark: Mark) => void) => (mark: Mark) => {
    set(mark);
    reading.reset();
  };
  return (
    <div className="grid gap-4">
      {isUnseen ? (
        <Notice alert>This file cannot be shown as a picture: choose a JPEG, PNG, WebP or AVIF.</Notice>
      ) : (
        <div className="marked-photo">
          {url !== null && (
            <img
              src={url}
              alt="Your photo of the sheet"
              draggable={false}
              onError={() => setIsUnseen(true)}
              onLoad={({ currentTarget: { naturalWidth, naturalHeight } }) => setRatio(naturalWidth / naturalHeight)}
            />
          )}
          <PhotoMark label="Sheet" mark={sheet} ratio={ratio} onMove={move(setSheet)} />
          <PhotoMark label={reference === 'white' ? 'White' : 'Grey'} mark={patch} ratio={ratio} onMove={move(setPatch)} />
        </div>
      )}
      <fieldset className="flex flex-wrap items-center gap-x-4 gap-y-1">
        <legend className="sr-only">What the sheet is compared with</legend>
        {(Object.keys(PATCH_WORDS) as Reference[]).map((kind) => (
          <label key={kind} className="flex min-h-8 items-center gap-2">
            <input type="radio" name="reference" checked={reference === kind} onChange={() => move(() => setReference(kind))(patch)} />
            {PATCH_WORDS[kind]}
          </label>
        ))}
        <button type="button" className="link-button ml-auto" onClick={onOther}>
          Another photo
        </button>
      </fieldset>
      {reading.error && <Notice alert>{sentenceOf(reading.error)}</Notice>}
      {reading.data && (
        <p className="reading" role="status">
          <i style={{ background: reading.data.hex }} aria-hidden="true" />
          <span>
            <b>{colorName(reading.data.hex)}</b> <span className="num">{reading.data.hex}</span>
            <br />
            <span className="text-ink-2">{sureness({ source: 'photographed', uncertainty: reading.data.uncertainty })}</span>
          </span>
        </p>
      )}
      <div className="flex justify-end gap-2">
        {reading.data ? (
          <Button variant="ink" onClick={() => onRead(reading.data)}>
            Use this colour
          </Button>
        ) : (
          <Button variant="ink" working={reading.isPending} disabled={isUnseen} onClick={() => reading.mutate({ file, sheet, patch, reference })}>
            Read the colour
          </Button>
        )}
      </div>
    </div>
  );
}

/** An address of the picked file for as long as it is shown. */
function useObjectUrl(file: File): string | null {
  const [url, setUrl] = useState<string | null>(null);
  useEffect(() => {
    const made = URL.createObjectURL(file);
    setUrl(made);
    return () => URL.revokeObjectURL(made);
  }, [file]);
  return url;
}
