import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { z } from 'zod';
import { PASSWORD_MAX } from '#shared/contracts/accounts';
import { Button } from '@/components/button';
import { TextField } from '@/components/field';
import { Notice } from '@/components/notice';
import { showErrors } from '@/lib/form-errors';
import { healthQuery, useSignIn } from '../api/session-queries';
import { DemoAccounts } from './demo-accounts';

const formSchema = z.object({
  email: z.string().trim().min(1, 'Write the email that you signed up with.').pipe(z.email('An email looks like name@place.example.')),
  password: z.string().min(1, 'Write your password.').max(PASSWORD_MAX, `A password has at most ${PASSWORD_MAX} characters.`),
});
type FormValues = z.infer<typeof formSchema>;

/** Only a path of this site: an address of another place could lead people astray. */
export const safeNext = (next: string | null): string => (next !== null && /^\/(?![/\\])/.test(next) ? next : '/');

export function SignInForm() {
  const navigate = useNavigate();
  const [params] = useSearchParams();
  const signIn = useSignIn();
  const { data: health } = useQuery(healthQuery);
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, setValue, formState } = useForm<FormValues>({
    resolver: zodResolver(formSchema),
    defaultValues: { email: '', password: '' },
  });

  const submit = handleSubmit(async (values) => {
    setFailure(null);
    try {
      await signIn.mutateAsync(values);
      await navigate(safeNext(params.get('next')), { replace: true });
    } catch (error) {
      setFailure(showErrors(error, ['email', 'password'], setError));
    }
  });

  return (
    <>
      <form className="grid gap-[14px]" onSubmit={submit} noValidate>
        {failure !== null && (
          <Notice alert className="bg-paper-2">
            {failure}
          </Notice>
        )}
        <TextField label="Email" type="email" autoComplete="email" size="big" {...register('email')} error={formState.errors.email?.message} />
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          size="big"
          {...register('password')}
          error={formState.errors.password?.message}
        />
        <Button type="submit" variant="ink" size="big" className="mt-1" working={signIn.isPending}>
          Sign in
        </Button>
      </form>
      {health?.mode === 'demo' && (
        <DemoAccounts
          accounts={health.demoAccounts ?? []}
          onChoose={({ email, password }) => {
            setValue('email', email, { shouldValidate: true });
            setValue('password', password, { shouldValidate: true });
          }}
        />
      )}
      <p className="mt-auto pt-2 text-12 text-ink-2">
        New here?{' '}
        <Link to="/sign-up" className="underline">
          Start a studio
        </Link>
        . If someone sent you a link, open it: no account is needed.
      </p>
    </>
  );
}
