import { useState, type FormEvent } from 'react';
import { sentenceOf } from '@/lib/form-errors';
import { Button } from './button';
import { Dialog } from './dialog';
import { TextField } from './field';
import { Notice } from './notice';

interface NameDialogProps {
  readonly title: string;
  readonly label: string;
  readonly initial?: string;
  readonly action: string;
  readonly maxLength: number;
  /** Stores the name; the dialog closes when it is done, and says why when it failed. */
  readonly onSave: (name: string) => Promise<unknown>;
  readonly onClose: () => void;
}

/** Asks for one name. Mount it when it is needed. */
export function NameDialog({ title, label, initial = '', action, maxLength, onSave, onClose }: NameDialogProps) {
  const [name, setName] = useState(initial);
  const [error, setError] = useState<string>();
  const [failure, setFailure] = useState<string | null>(null);
  const [isSaving, setIsSaving] = useState(false);

  const submit = async (event: FormEvent): Promise<void> => {
    event.preventDefault();
    if (name.trim() === '') return setError('Write a name first.');
    setIsSaving(true);
    setFailure(null);
    try {
      await onSave(name.trim());
      onClose();
    } catch (problem) {
      setFailure(sentenceOf(problem));
      setIsSaving(false);
    }
  };

  return (
    <Dialog open onClose={onClose} title={title}>
      <form onSubmit={(event) => void submit(event)} className="grid gap-4" noValidate>
        {failure !== null && (
          <Notice alert className="bg-paper-2">
            {failure}
          </Notice>
        )}
        <TextField
          label={label}
          value={name}
          maxLength={maxLength}
          error={error}
          autoComplete="off"
          onChange={(event) => {
            setName(event.target.value);
            setError(undefined);
          }}
        />
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
