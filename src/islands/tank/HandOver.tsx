import { useState } from 'react';
import type { Handover } from '~/domain/access/handover';
import { newHandover } from '~/domain/access/handover';
import { handOver, listHandovers } from '../shared/api';
import { Choice } from '../shared/Field';
import { FaultSummary } from '../shared/FaultSummary';
import { Moment } from '../shared/Moment';
import { useAwake } from '../shared/use-awake';
import { useSentForm } from '../shared/use-sent-form';

interface Owner {
  id: string;
  name: string;
}

/** Who sees this tank, and one more owner to hand it over to. */
export function HandOver(props: {
  tankId: string;
  owners: readonly Owner[];
  handovers: readonly Handover[];
}) {
  const [handovers, setHandovers] = useState(props.handovers);
  const left = props.owners.filter(({ id }) => !handovers.some(({ userId }) => userId === id));
  return (
    <div className="grid gap-5">
      {handovers.length > 0 && (
        <ul>
          {handovers.map((one) => (
            <li key={one.userId} className="border-b border-hair py-2">
              <strong className="font-semibold">{one.name}</strong> since{' '}
              <Moment at={one.handedOverAt} withTime={false} />
              <span className="label"> by {one.handedOverBy}</span>
            </li>
          ))}
        </ul>
      )}
      {props.owners.length === 0 && (
        <p className="text-ink-2">
          The workshop has no member with the role owner yet, so there is nobody to hand over to.
        </p>
      )}
      {props.owners.length > 0 && left.length === 0 && (
        <p className="text-ink-2">Every owner of the workshop sees it.</p>
      )}
      {left.length > 0 && (
        <HandOverForm
          key={left.map(({ id }) => id).join()}
          tankId={props.tankId}
          owners={left}
          onDone={setHandovers}
        />
      )}
    </div>
  );
}

function HandOverForm(props: {
  tankId: string;
  owners: readonly Owner[];
  onDone(handovers: readonly Handover[]): void;
}) {
  const awake = useAwake();
  const sent = useSentForm({
    schema: newHandover,
    defaults: { userId: props.owners[0]!.id },
    send: async ({ userId }) => {
      await handOver(props.tankId, userId);
      return listHandovers(props.tankId);
    },
    done: props.onDone,
  });
  return (
    <form onSubmit={sent.submit} noValidate className="grid max-w-sm gap-4" aria-label="Hand over">
      <FaultSummary faults={sent.faults} failures={sent.failures} />
      <Choice
        of={sent}
        name="userId"
        label="Owner"
        options={props.owners.map(({ id, name }) => ({ value: id, text: name }))}
        hint="From then on they see this tank, its chart and its card."
      />
      <div>
        <button className="act-plain" disabled={!awake || sent.sending}>
          {sent.sending ? 'Handing over…' : 'Hand over'}
        </button>
      </div>
    </form>
  );
}
