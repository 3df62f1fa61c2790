import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { PASSWORD_MAX, PASSWORD_MIN } from '#shared/contracts/accounts';
import { Button } from '@/components/button';
import { TextField } from '@/components/field';
import { Notice } from '@/components/notice';
import { showErrors } from '@/lib/form-errors';
import { useSignUp } from '../api/session-queries';

const nameSchema = (missing: string) => z.string().trim().min(1, missing).max(120, 'Use at most 120 characters.');

const formSchema = z.object({
  name: nameSchema('Write the name that members will see.'),
  studioName: nameSchema('Give the studio a name; it can be changed later.'),
  email: z.string().trim().min(1, 'Write an email to sign in with.').pipe(z.email('An email looks like name@place.example.')),
  password: z
    .string()
    .min(PASSWORD_MIN, `Use at least ${PASSWORD_MIN} characters; three unrelated words do well.`)
    .max(PASSWORD_MAX, `Use at most ${PASSWORD_MAX} characters.`),
});
type FormValues = z.infer<typeof formSchema>;

export function SignUpForm() {
  const navigate = useNavigate();
  const signUp = useSignUp();
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, formState } = useForm<FormValues>({
    resolver: zodResolver(formSchema),
    defaultValues: { name: '', studioName: '', email: '', password: '' },
  });
  const { errors } = formState;

  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      await signUp.mutateAsync(values);
      await navigate('/', { replace: true });
    } catch (error) {
      setFailure(showErrors(error, ['name', 'studioName', 'email', 'password'], setError));
    }
  });

  return (
    <>
      <form className="grid gap-3" onSubmit={submit} noValidate>
        {failure !== null && (
          <Notice alert className="bg-paper-2">
            {failure}
          </Notice>
        )}
        <div className="grid gap-3 sm:grid-cols-2">
          <TextField label="Your name" autoComplete="name" size="big" {...register('name')} error={errors.name?.message} />
          <TextField label="Studio" autoComplete="organization" size="big" {...register('studioName')} error={errors.studioName?.message} />
        </div>
        <TextField label="Email" type="email" autoComplete="email" size="big" {...register('email')} error={errors.email?.message} />
        <TextField
          label="Password"
          type="password"
          autoComplete="new-password"
          size="big"
          {...register('password')}
          error={errors.password?.message}
          hint={errors.password === undefined ? `At least ${PASSWORD_MIN} characters` : undefined}
        />
        <Button type="submit" variant="ink" size="big" className="mt-1" working={signUp.isPending}>
          Start a studio
        </Button>
      </form>
      <p className="mt-auto pt-4 text-12 text-ink-2">
        Here before?{' '}
        <Link to="/sign-in" className="underline">
          Sign in
        </Link>
        .
      </p>
    </>
  );
}
