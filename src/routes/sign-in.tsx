import { SignFrame } from '@/features/session/components/sign-frame';
import { SignInForm } from '@/features/session/components/sign-in-form';

export function Component() {
  return (
    <>
      <title>Sign in · Pairleaf</title>
      <SignFrame
        title={
          <>
            Plan the spread
            <br />
            before you cut
            <br />
            the photo.
          </>
        }
      >
        <SignInForm />
      </SignFrame>
    </>
  );
}
