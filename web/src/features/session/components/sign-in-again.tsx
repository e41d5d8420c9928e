import { useForm } from 'react-hook-form';
import { Button } from '../../../components/button.tsx';
import { Dialog } from '../../../components/dialog.tsx';
import { TextField } from '../../../components/field.tsx';
import { ProblemNotice } from '../../../components/notice.tsx';
import { useSignInAgain, type Person } from '../api/session.ts';

/** Over a page whose session has ended: nothing on it is lost. */
export function SignInAgain({ person }: { person: Person }) {
  const signIn = useSignInAgain();
  const { register, handleSubmit, formState: { errors } } = useForm<{ password: string }>();
  const submit = handleSubmit(({ password }) => signIn.mutate({ email: person.email, password }));
  return (
    <Dialog title="Your session has ended" onClose={null}>
      <form className="space-y-4" noValidate onSubmit={(event) => void submit(event)}>
        <p>Sign in again to go on where you were. What you have typed is still here.</p>
        <TextField label="E-mail" type="email" autoComplete="username" value={person.email} readOnly />
        <TextField label="Password" type="password" autoComplete="current-password" autoFocus error={errors.password?.message} {...register('password', { required: 'Give your password.' })} />
        {signIn.error && <ProblemNotice error={signIn.error} />}
        <div className="flex flex-wrap items-center justify-between gap-3">
          <a href="/sign-in">I am somebody else</a>
          <Button kind="main" type="submit" busy={signIn.isPending}>Sign in again</Button>
        </div>
      </form>
    </Dialog>
  );
}
