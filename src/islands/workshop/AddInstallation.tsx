import { newInstallation } from '~/domain/installation/installation';
import { createInstallation } from '../shared/api';
import { Choice, Field } from '../shared/Field';
import { FaultSummary } from '../shared/FaultSummary';
import { useSentForm } from '../shared/use-sent-form';

const kinds = [
  { value: 'vehicle', text: 'vehicle' },
  { value: 'boat', text: 'boat' },
  { value: 'place', text: 'place: a hut, a cabin, a yard' },
] as const;

/** A vehicle, boat or place that tanks are fitted in. */
export function AddInstallation() {
  const sent = useSentForm({
    schema: newInstallation,
    defaults: { name: '', kind: 'vehicle' },
    send: createInstallation,
    done: ({ id }) =>
      window.location.assign(`/home?installation=${encodeURIComponent(id)}#new-tank`),
  });
  return (
    <form
      onSubmit={sent.submit}
      noValidate
      className="grid max-w-md gap-5"
      aria-label="Add an installation"
    >
      <FaultSummary faults={sent.faults} failures={sent.failures} />
      <Field
        of={sent}
        name="name"
        label="Name"
        hint="As people call it: “Service van 3”, “Workboat Skua”."
        autoComplete="off"
      />
      <Choice of={sent} name="kind" label="It is a" options={kinds} />
      <div>
        <button className="act" disabled={sent.sending}>
          {sent.sending ? 'Adding…' : 'Add the installation'}
        </button>
      </div>
    </form>
  );
}
