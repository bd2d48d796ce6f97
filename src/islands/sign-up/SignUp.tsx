import { useEffect, useState } from 'react';
import { signUp } from '~/domain/access/account';
import { newInstallation } from '~/domain/installation/installation';
import { carriedDraft, type CarriedDraft } from '../front/carried-draft';
import { signUp as sendSignUp } from '../shared/api';
import { FaultSummary } from '../shared/FaultSummary';
import { Field } from '../shared/Field';
import { useSentForm } from '../shared/use-sent-form';
import { settleDraft } from './settle-draft';

/** A new workshop; its first member is the manager. A draft from the front page comes along. */
export function SignUp() {
  const [draft, setDraft] = useState<CarriedDraft | null>(null);
  // only the browser knows of it, so the server renders the form without
  useEffect(() => setDraft(carriedDraft()), []);
  return <SignUpForm key={draft === null ? 'plain' : 'with-draft'} draft={draft} />;
}

function SignUpForm({ draft }: { draft: CarriedDraft | null }) {
  const sent = useSentForm({
    schema: signUp.extend({
      installationName:
        draft === null ? newInstallation.shape.name.optional() : newInstallation.shape.name,
    }),
    defaults: {
      workshopName: '',
      name: '',
      email: '',
      password: '',
      installationName: draft === null ? undefined : '',
    },
    send: async ({ installationName, ...account }) => {
      await sendSignUp(account);
      return settleDraft(installationName);
    },
    done: (next) => window.location.assign(next),
  });
  return (
    <form onSubmit={sent.submit} noValidate className="grid gap-5" aria-label="Open a workshop">
      <FaultSummary faults={sent.faults} failures={sent.failures} />
      <Field
        of={sent}
        name="workshopName"
        label="Workshop"
        autoComplete="organization"
        hint="The firm, as it shall stand on your charts."
      />
      <Field of={sent} name="name" label="Your name" autoComplete="name" />
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
        autoComplete="new-password"
        hint="At least 12 characters. A few words in a row serve well."
      />
      {draft && (
        <Field
          of={sent}
          name="installationName"
          label="Boat that the tank is fitted in"
          hint={`Your ${draft.design.name} comes along as a draft; you land on its bench.`}
        />
      )}
      <div>
        <button className="act" disabled={sent.sending}>
          {sent.sending ? 'Opening…' : 'Open the workshop'}
        </button>
      </div>
    </form>
  );
}
