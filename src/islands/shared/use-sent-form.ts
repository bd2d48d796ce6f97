import { zodResolver } from '@hookform/resolvers/zod';
import { useId, useState } from 'react';
import {
  useForm,
  type DefaultValues,
  type FieldValues,
  type Path,
  type UseFormReturn,
} from 'react-hook-form';
import type { z } from 'zod/v4';
import { asProblem } from './problem';

export interface Fault {
  /** Id of the field's element, or null for a fault of the whole form. */
  fieldId: string | null;
  detail: string;
}

export interface SentForm<In extends FieldValues, Out> {
  form: UseFormReturn<In, unknown, Out>;
  submit: (event?: React.BaseSyntheticEvent) => Promise<void>;
  sending: boolean;
  /** What is wrong, in the order of the fields, after a failed sending. */
  faults: readonly Fault[];
  /** Rises with every failed sending, so that the summary takes focus again. */
  failures: number;
  fieldId: (name: string) => string;
  faultOf: (name: string) => string | undefined;
}

/**
 * A form that is checked by the same schema in the browser as on the server, sent once, and told of
 * the server's faults beside the fields they point at. A fault that points at no field here is
 * shown in the summary, never dropped. Nothing typed is lost.
 */
export function useSentForm<In extends FieldValues, Out, Answer>(options: {
  schema: z.ZodType<Out, In>;
  /** Every field of the form, in the order shown. */
  defaults: DefaultValues<NoInfer<In>>;
  send: (values: Out) => Promise<Answer>;
  done: (answer: Answer) => void;
  /** The server's name of a field, if it is not the form's: `/settings/outletMm` → `outletMm`. */
  fieldOf?: (pointer: string) => string;
}): SentForm<In, Out> {
  const prefix = useId();
  const [failures, setFailures] = useState(0);
  const [general, setGeneral] = useState<readonly string[]>([]);
  const form = useForm<In, unknown, Out>({
    resolver: zodResolver(options.schema),
    defaultValues: options.defaults,
    shouldFocusError: false,
  });
  const names = Object.keys(options.defaults);
  const errors = form.formState.errors as Record<string, { message?: string } | undefined>;
  const fieldId = (name: string): string => `${prefix}-${name}`;
  const faultOf = (name: string): string | undefined => errors[name]?.message;

  async function send(values: Out): Promise<void> {
    setGeneral([]);
    try {
      options.done(await options.send(values));
    } catch (error) {
      const problem = asProblem(error);
      const nameOf = options.fieldOf ?? ((pointer: string) => pointer.slice(1));
      const placed = problem.faults.map(({ pointer, detail }) => ({
        name: nameOf(pointer),
        detail,
      }));
      const loose = placed.filter(({ name }) => !names.includes(name)).map(({ detail }) => detail);
      for (const { name, detail } of placed) {
        if (names.includes(name))
          form.setError(name as Path<In>, { type: 'server', message: detail });
      }
      setGeneral(placed.length === 0 ? [problem.message] : loose);
      setFailures((count) => count + 1);
    }
  }

  return {
    form,
    submit: form.handleSubmit(send, () => {
      setGeneral([]);
      setFailures((count) => count + 1);
    }),
    sending: form.formState.isSubmitting,
    faults: [
      ...general.map((detail) => ({ fieldId: null, detail })),
      ...names.flatMap((name) => {
        const detail = faultOf(name);
        return detail === undefined ? [] : [{ fieldId: fieldId(name), detail }];
      }),
    ],
    failures,
    fieldId,
    faultOf,
  };
}
