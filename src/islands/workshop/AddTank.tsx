import { useEffect, useState } from 'react';
import { useWatch } from 'react-hook-form';
import type { Installation } from '~/domain/installation/installation';
import { liquidCodes, liquids } from '~/domain/liquid/liquids';
import { carriedDraft, dropCarriedDraft, type CarriedDraft } from '../front/carried-draft';
import { createTank } from '../shared/api';
import { Choice, Field } from '../shared/Field';
import { FaultSummary } from '../shared/FaultSummary';
import { NoGas } from '../shared/NoGas';
import { useSentForm } from '../shared/use-sent-form';
import { carriedCode, newTankForm, newTankOf } from './new-tank-form';
import { StartingPointChoice, type Shape } from './StartingPointChoice';

interface Props {
  installations: readonly Installation[];
  /** Of the installation that was just added, if any. */
  chosen: string | null;
  shapes: readonly Shape[];
}

/** A new tank in an installation, from a shape of real life; leads on to its bench. */
export function AddTank(props: Props) {
  const [carried, setCarried] = useState<CarriedDraft | null>(null);
  // only the browser knows of a draft from the front page
  useEffect(() => setCarried(carriedDraft()), []);
  return <AddTankForm key={carried === null ? 'plain' : 'carried'} {...props} carried={carried} />;
}

function AddTankForm({
  installations,
  chosen,
  shapes,
  carried,
}: Props & { carried: CarriedDraft | null }) {
  const sent = useSentForm({
    schema: newTankForm,
    defaults: {
      installationId: chosen ?? installations[0]?.id ?? '',
      name: carried?.design.name ?? '',
      liquid: carried?.liquid ?? 'drinking-water',
      densityKgPerM3: '',
      startingPoint: carried === null ? 'plain-box' : carriedCode,
    },
    send: async (form) => {
      const tank = await createTank(newTankOf(form, carried?.design ?? null));
      if (form.startingPoint === carriedCode) dropCarriedDraft();
      return tank;
    },
    done: ({ id }) => window.location.assign(`/tanks/${encodeURIComponent(id)}/bench`),
    fieldOf: (pointer) =>
      pointer.startsWith('/design') ? 'startingPoint' : pointer.split('/').at(-1)!,
  });
  const liquid = useWatch({ control: sent.form.control, name: 'liquid' });
  const hull = shapes.find(({ code }) => code === 'v-hull');
  const offered =
    carried === null || hull === undefined
      ? shapes
      : [
          { ...hull, code: carriedCode, label: 'Your hull', words: 'from the front page' },
          ...shapes,
        ];
  return (
    <form onSubmit={sent.submit} noValidate className="grid gap-5" aria-label="Add a tank">
      <FaultSummary faults={sent.faults} failures={sent.failures} />
      <div className="grid gap-5 sm:grid-cols-2 lg:grid-cols-3">
        <Choice
          of={sent}
          name="installationId"
          label="Fitted in"
          options={installations.map(({ id, name }) => ({ value: id, text: name }))}
        />
        <Field
          of={sent}
          name="name"
          label="Name"
          hint="Where it sits tells it from its twin: “Port diesel tank”."
          autoComplete="off"
        />
        <Choice
          of={sent}
          name="liquid"
          label="Liquid"
          options={liquidCodes.map((code) => ({ value: code, text: liquids[code].name }))}
          hint={<NoGas />}
        />
        {liquids[liquid].densityKgPerM3 === null && (
          <Field
            of={sent}
            name="densityKgPerM3"
            label="Density, kg/m³"
            inputMode="decimal"
            hint="Fresh water is 998, diesel about 840."
            autoComplete="off"
          />
        )}
      </div>
      <StartingPointChoice of={sent} shapes={offered} />
      <div>
        <button className="act" disabled={sent.sending}>
          {sent.sending ? 'Adding…' : 'Add the tank and open its bench'}
        </button>
      </div>
    </form>
  );
}
