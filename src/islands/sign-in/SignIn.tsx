import { signIn } from '~/domain/access/account';
import { signIn as sendSignIn } from '../shared/api';
import { FaultSummary } from '../shared/FaultSummary';
import { Field } from '../shared/Field';
import { useSentForm } from '../shared/use-sent-form';

/** Sign-in; goes on to `next`, an address on this host. */
export function SignIn({ next }: { next: string }) {
  const sent = useSentForm({
    schema: signIn,
    defaults: { email: '', password: '' },
    send: sendSignIn,
    done: () => window.location.assign(next),
  });
  return (
    <form onSubmit={sent.submit} noValidate className="grid gap-5" aria-label="Sign in">
      <FaultSummary faults={sent.faults} failures={sent.failures} />
      <Field
        of={sent}
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        inputMode="email"
      />
      <Field
        of={sent}
        name="password"
        label="Password"
        type="password"
        autoComplete="current-password"
      />
      <div>
        <button className="act" disabled={sent.sending}>
          {sent.sending ? 'Signing in…' : 'Sign in'}
        </button>
      </div>
    </form>
  );
}
