import { useMutation, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { EXPORT_FORMATS, EXPORT_SIZES, KEEP_EXPORTS_DAYS, PRINT_PPI, type CreateExport } from '#shared/contracts/exports';
import { exportPixels } from '#shared/scene/export-size';
import { pageRects } from '#shared/scene/page-rects';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { Notice } from '@/components/notice';
import { ApiError } from '@/lib/api';
import { newId } from '@/lib/ids';
import { jobQuery, startExport } from '@/features/composer/api/spread-queries';
import { useComposer, useComposerStore } from '@/features/composer/hooks/composer-context';

type Size = CreateExport['size'];
type Format = CreateExport['format'];

const NOT_SAVED = 'Your latest changes could not be saved, and the server draws only what is saved. Try again when the bar says Saved.';
const FORMAT_WORDS: Record<Format, string> = { png: 'PNG, exact', jpeg: 'JPEG, smaller file' };

/** Takes the preview picture away: the server draws it from what is saved. */
export function ExportDialog({ spreadId, onClose }: { spreadId: string; onClose: () => void }) {
  const store = useComposerStore();
  const doc = useComposer((state) => state.doc);
  const [size, setSize] = useState<Size>('screen');
  const [format, setFormat] = useState<Format>('png');
  const start = useMutation({
    mutationFn: async () => {
      const { flush, savedRevision } = store.getState();
      if (!(await flush())) throw new ApiError({ code: 'unavailable', status: 0, detail: NOT_SAVED });
      return startExport(spreadId, { id: newId(), size, format, revision: savedRevision() });
    },
  });
  const job = useQuery(jobQuery(start.data?.id ?? null)).data ?? start.data;
  const isWorking = start.isPending || job?.state === 'waiting' || job?.state === 'running';
  const choose = (change: () => void): void => {
    change();
    start.reset();
  };
  return (
    <Dialog open onClose={onClose} title="Preview picture" description="The spread as it is planned, without grid, notes or marks.">
      <div className="export-choice" role="group" aria-label="Size">
        {EXPORT_SIZES.map((id) => {
          const px = exportPixels(pageRects(doc), id);
          return (
            <button key={id} type="button" className="opt" aria-pressed={size === id} onClick={() => choose(() => setSize(id))}>
              {id === 'screen' ? 'To look at' : `To print, ${PRINT_PPI} ppi`}
              <span className="num">
                {px.width} × {px.height}
              </span>
            </button>
          );
        })}
      </div>
      <div className="export-choice" role="group" aria-label="Kind of file">
        {EXPORT_FORMATS.map((id) => (
          <button key={id} type="button" className="opt" aria-pressed={format === id} onClick={() => choose(() => setFormat(id))}>
            {FORMAT_WORDS[id]}
          </button>
        ))}
      </div>
      <div className="export-act">
        {job?.state === 'done' && job.resultUrl ? (
          <a className="btn" data-variant="ink" href={job.resultUrl} download>
            Download
          </a>
        ) : (
          <Button variant="ink" working={isWorking} onClick={() => start.mutate()}>
            {isWorking ? 'Drawing…' : 'Draw it'}
          </Button>
        )}
        <p role="status">
          {isWorking && `The server draws it: ${Math.round((job?.progress ?? 0) * 100)}%.`}
          {job?.state === 'done' && `Ready. It is kept for ${KEEP_EXPORTS_DAYS} days.`}
        </p>
      </div>
      {(start.isError || job?.state === 'failed') && (
        <Notice alert className="mt-4">
          {job?.failure ?? (start.error instanceof ApiError ? start.error.detail : 'The picture could not be drawn. Your plan is safe; try again.')}
        </Notice>
      )}
    </Dialog>
  );
}
