'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { signIn, type SignInResponse } from 'next-auth/react';
import { useRouter } from 'next/navigation';
import { useForm } from 'react-hook-form';
import { TextField } from '@/components/forms/text-field';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/lib/paths';
import { signInInput, type SignInInput } from '@/lib/people/schema';

/** E-mail and password. A wrong pair is one sentence that does not tell which of the two was wrong. */
export function SignInForm() {
  const router = useRouter();
  const form = useForm<SignInInput>({
    resolver: zodResolver(signInInput),
    defaultValues: { email: '', password: '' },
  });
  const { errors, isSubmitting } = form.formState;

  const enter = form.handleSubmit(async (input) => {
    const answer = await signIn('credentials', { ...input, redirect: false });
    if (answer?.ok === true && answer.error === null) {
      router.replace(paths.home);
      router.refresh();
      return;
    }
    form.setError('root', {
      message: refusalWords(answer),
    });
  });

  return (
    <form onSubmit={(event) => void enter(event)} noValidate className="mt-5 grid max-w-sm gap-5">
      {errors.root?.message === undefined ? null : (
        <Notice tone="act" title="Not signed in" role="alert">
          {errors.root.message}
        </Notice>
      )}
      <TextField
        label="E-mail"
        type="email"
        autoComplete="username"
        problem={errors.email?.message}
        {...form.register('email')}
      />
      <TextField
        label="Password"
        type="password"
        autoComplete="current-password"
        problem={errors.password?.message}
        {...form.register('password')}
      />
      <Button type="submit" shape="main" disabled={isSubmitting}>
        {isSubmitting ? 'Signing in…' : 'Sign in'}
      </Button>
    </form>
  );
}

/** What next-auth answered, in words: its own for a wrong pair, the server's sentence for a closed address. */
function refusalWords(answer: SignInResponse | undefined): string {
  if (answer?.status !== 401) return 'Marlwick did not answer. Check the connection and try again.';
  return answer.error === null || answer.error === undefined || answer.error === 'CredentialsSignin'
    ? 'This e-mail and password do not belong together. Check both and try again.'
    : answer.error;
}
