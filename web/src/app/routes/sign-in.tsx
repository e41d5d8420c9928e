import { useQuery } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { Navigate, useSearchParams } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { TextField } from '../../components/field.tsx';
import { Mark } from '../../components/mark.tsx';
import { ProblemNotice } from '../../components/notice.tsx';
import { SheetFrame } from '../../components/sheet-frame.tsx';
import { ThreeViews } from '../../components/three-views.tsx';
import { TitleBlock } from '../../components/title-block.tsx';
import { sessionQuery, useSignIn, type SignInInput } from '../../features/session/api/session.ts';
import { useTitle } from '../../lib/use-title.ts';

export function Component() {
  useTitle('Sign in');
  const [search] = useSearchParams();
  const session = useQuery(sessionQuery);
  const signIn = useSignIn();
  const { register, handleSubmit, formState: { errors } } = useForm<SignInInput>();
  if (session.data) return <Navigate to={localPath(search.get('next'))} replace />;

  return (
    <div className="mx-auto flex min-h-dvh max-w-[96rem] flex-col p-2 sm:p-3">
      <SheetFrame className="flex grow flex-col">
        <div className="grid grow lg:grid-cols-[1fr_27rem]">
          <div className="hidden place-items-center p-8 lg:grid"><ThreeViews heading={30} elevation={10} bank={20} className="w-full max-w-3xl" /></div>
          <main className="flex flex-col lg:border-l lg:border-rule">
            <div className="flex grow flex-col justify-center p-6 sm:p-10">
              <h1 className="flex items-center gap-2 text-2xl font-bold tracking-[0.14em] uppercase [font-stretch:125%]"><Mark />Dextral</h1>
              <p className="mt-2 max-w-[40ch] text-soft">Keeps attitude data meaning the same thing on both sides of an interface.</p>
              <form className="mt-8 space-y-4" noValidate onSubmit={(event) => void handleSubmit((input) => signIn.mutate(input))(event)}>
                <TextField label="E-mail" type="email" autoComplete="username" error={errors.email?.message} {...register('email', { required: 'Give the address of your account.' })} />
                <TextField label="Password" type="password" autoComplete="current-password" error={errors.password?.message} {...register('password', { required: 'Give your password.' })} />
                {signIn.error && <ProblemNotice error={signIn.error} />}
                <Button kind="main" type="submit" className="w-full" busy={signIn.isPending}>Sign in</Button>
              </form>
            </div>
            <TitleBlock cells={[['Title', 'Sign in'], ['Sheet', '000']]} />
          </main>
        </div>
      </SheetFrame>
    </div>
  );
}

/** Only ever leads to a page of this console, whatever the address says. */
function localPath(next: string | null): string {
  return next !== null && /^\/(?![/\\])/.test(next) ? next : '/';
}
