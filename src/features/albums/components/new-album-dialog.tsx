import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import type { Studio } from '#shared/contracts/accounts';
import { gridOf } from '#shared/geometry/grid';
import { PAGE_FORMATS, type PageFormat } from '#shared/model/page-format';
import { formatLength } from '#shared/words/measure';
import { Button } from '@/components/button';
import { Dialog } from '@/components/dialog';
import { Field, TextField } from '@/components/field';
import { Notice } from '@/components/notice';
import { showErrors } from '@/lib/form-errors';
import { albumQueries } from '../api/album-queries';
import { useCreateAlbum } from '../api/album-mutations';

const formSchema = z.object({
  title: z.string().trim().min(1, 'Write what the album is called.').max(120, 'Use at most 120 characters.'),
  formatId: z.string().min(1),
});
type FormValues = z.infer<typeof formSchema>;

interface NewAlbumDialogProps {
  readonly studio: Studio;
  readonly onClose: () => void;
  readonly onMade: (albumId: string) => void;
}

/** Asks for an album's name and its page format, which every spread of it copies. */
export function NewAlbumDialog({ studio, onClose, onMade }: NewAlbumDialogProps) {
  const { data: formats = PAGE_FORMATS } = useQuery(albumQueries.formats(studio.id));
  const create = useCreateAlbum(studio.id);
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, watch, formState } = useForm<FormValues>({
    resolver: zodResolver(formSchema),
    defaultValues: { title: '', formatId: (PAGE_FORMATS.find(({ unit }) => unit === studio.unit) ?? PAGE_FORMATS[0]!).id },
  });
  const chosen = formats.find(({ id }) => id === watch('formatId'));

  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      const { id } = await create.mutateAsync(values);
      onClose();
      onMade(id);
    } catch (error) {
      setFailure(showErrors(error, ['title', 'formatId'], setError));
    }
  });

  return (
    <Dialog open onClose={onClose} title="New album">
      <form onSubmit={submit} className="grid gap-4" noValidate>
        {failure !== null && (
          <Notice alert className="bg-paper-2">
            {failure}
          </Notice>
        )}
        <TextField label="Name" autoComplete="off" {...register('title')} error={formState.errors.title?.message} />
        <Field label="Page format" hint={chosen && describeFormat(chosen)}>
          {(control) => (
            <select {...control} {...register('formatId')} className="field-input">
              {formats.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </select>
          )}
        </Field>
        <div className="flex justify-end gap-2">
          <Button variant="bare" onClick={onClose}>
            Cancel
          </Button>
          <Button type="submit" variant="ink" working={create.isPending}>
            Make album
          </Button>
        </div>
      </form>
    </Dialog>
  );
}

/** A format's grid in one line. */
function describeFormat(format: PageFormat): string {
  const { columns, rows } = gridOf(format);
  const edge = format.edge === 'bleed' ? 'mats may reach the page’s edge' : 'a margin all round';
  return `A grid of ${columns} × ${rows} steps of ${formatLength(format.step, format.unit)} ${format.unit}, ${edge}.`;
}
