import { useId, type ComponentProps, type ReactNode } from 'react';

interface FieldProps {
  readonly label: ReactNode;
  /** What is wrong with the value, in one sentence; announced and tied to the control. */
  readonly error?: string;
  readonly hint?: ReactNode;
  readonly children: (control: { id: string; 'aria-invalid'?: true; 'aria-describedby'?: string }) => ReactNode;
  readonly className?: string;
}

/** A label, a control and what there is to say about its value. */
export function Field({ label, error, hint, children, className = '' }: FieldProps) {
  const id = useId();
  const describedBy = [error !== undefined && `${id}-error`, hint !== undefined && `${id}-hint`].filter(Boolean).join(' ');
  return (
    <div className={className}>
      <label htmlFor={id} className="mb-[6px] block font-semibold">
        {label}
      </label>
      {children({
        id,
        ...(error !== undefined && { 'aria-invalid': true as const }),
        ...(describedBy !== '' && { 'aria-describedby': describedBy }),
      })}
      {error !== undefined && (
        <p id={`${id}-error`} className="mt-1 text-13 text-cut-deep" role="alert">
          {error}
        </p>
      )}
      {hint !== undefined && (
        <p id={`${id}-hint`} className="mt-1 text-12 text-ink-2">
          {hint}
        </p>
      )}
    </div>
  );
}

interface TextFieldProps extends Omit<ComponentProps<'input'>, 'size' | 'id'> {
  readonly label: ReactNode;
  readonly error?: string;
  readonly hint?: ReactNode;
  readonly size?: 'normal' | 'big';
}

/** A text field; spread react-hook-form's `register()` on it. */
export function TextField({ label, error, hint, size = 'normal', className = '', ...input }: TextFieldProps) {
  return (
    <Field label={label} error={error} hint={hint} className={className}>
      {(control) => <input type="text" {...input} {...control} className="field-input" data-size={size} />}
    </Field>
  );
}
