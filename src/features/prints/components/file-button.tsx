import { useRef } from 'react';
import { Button, type ButtonVariant } from '@/components/button';

/** Formats that the studio takes; the server looks at the content and has the last word. */
const ACCEPTED = 'image/jpeg,image/png,image/webp,image/tiff,image/avif,.jpg,.jpeg,.png,.webp,.tif,.tiff,.avif';

interface FileButtonProps {
  readonly label: string;
  readonly variant?: ButtonVariant;
  readonly onFiles: (files: readonly File[]) => void;
}

/** Opens the file picker, for many files at once. */
export function FileButton({ label, variant = 'paper', onFiles }: FileButtonProps) {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <Button variant={variant} onClick={() => input.current?.click()}>
        {label}
      </Button>
      <input
        ref={input}
        type="file"
        multiple
        accept={ACCEPTED}
        className="hidden"
        aria-label={label}
        tabIndex={-1}
        onChange={(event) => {
          onFiles(Array.from(event.target.files ?? []));
          event.target.value = '';
        }}
      />
    </>
  );
}
