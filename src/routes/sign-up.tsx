import { SignFrame } from '@/features/session/components/sign-frame';
import { SignUpForm } from '@/features/session/components/sign-up-form';

export function Component() {
  return (
    <>
      <title>Start a studio · Pairleaf</title>
      <SignFrame title="Start a studio">
        <SignUpForm />
      </SignFrame>
    </>
  );
}
