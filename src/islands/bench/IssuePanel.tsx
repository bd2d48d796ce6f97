import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod/v4';
import { newRevision, type NewRevision } from '~/domain/tank/tank';
import { issueRevision } from '../shared/api';
import { asProblem } from '../shared/problem';

interface IssuePanelProps {
  tankId: string;
  letter: string;
  /** Why the server does not have all that is shown yet; null when it has. */
  waitsFor: string | null;
  /** What takes long in issuing this tank, as a sentence. */
  slow?: string | null;
  onIssued(letter: string): void;
  onClose(): void;
}

/** Issues the draft as the next revision: asks for the step and a note, tells reasons against it. */
export function IssuePanel(props: IssuePanelProps) {
  const { tankId, letter, waitsFor, slow, onIssued, onClose } = props;
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  const form = useForm<z.input<typeof newRevision>, unknown, NewRevision>({
    resolver: zodResolver(newRevision),
    defaultValues: { stepMm: 5, note: '' },
  });
  const issue = useMutation({
    mutationFn: (body: NewRevision) => issueRevision(tankId, body),
    onSuccess: (revision) => onIssued(revision.letter),
  });
  const problem = issue.error ? asProblem(issue.error) : null;
  const reasons = problem?.faults
    .map(({ detail }) => detail)
    .filter((one) => one !== problem.message);
  const { errors } = form.formState;

  return (
    <section className="border-b border-ink bg-sheet px-4 py-4 sm:px-6" aria-labelledby="issue">
      <h2 id="issue" ref={heading} tabIndex={-1} className="outline-none">
        Issue revision {letter}
      </h2>
      <p className="max-w-2xl">
        The shape, its settings and the whole table are frozen and kept. An issued revision is never
        changed or deleted; a later one takes its place.
      </p>
      <form
        className="mt-3 flex flex-wrap items-start gap-x-6 gap-y-3"
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => issue.mutate(body))(event)}
      >
        <label className="label w-40">
          step of the table, mm
          <input
            className="typed text-base text-ink"
            inputMode="decimal"
            aria-invalid={errors.stepMm !== undefined}
            aria-describedby={errors.stepMm ? 'step-fault' : undefined}
            {...form.register('stepMm', { valueAsNumber: true })}
          />
          {errors.stepMm && (
            <span id="step-fault" className="fault block">
              {errors.stepMm.message}
            </span>
          )}
        </label>
        <label className="label min-w-48 flex-1">
          note, if any: what is new in it
          <input
            className="typed text-base text-ink"
            aria-invalid={errors.note !== undefined}
            {...form.register('note')}
          />
          {errors.note && <span className="fault block">{errors.note.message}</span>}
        </label>
        <div className="flex gap-3 self-end">
          <button type="submit" className="act" disabled={issue.isPending || waitsFor !== null}>
            {issue.isPending ? 'Computing the table …' : `Issue ${letter}`}
          </button>
          <button type="button" className="act-plain" onClick={onClose}>
            Not now
          </button>
        </div>
      </form>
      {slow && issue.isPending && (
        <p role="status" className="mt-3">
          {slow}
        </p>
      )}
      {waitsFor !== null && !issue.isPending && (
        <p role="status" className="fault mt-3">
          What is saved is what gets issued. {waitsFor}
        </p>
      )}
      {problem && waitsFor === null && Object.keys(errors).length === 0 && (
        <div role="alert" className="mt-3">
          <p className="fault">{problem.message}</p>
          {reasons && reasons.length > 0 && (
            <ul className="list-disc pl-6">
              {reasons.map((reason) => (
                <li key={reason}>{reason}</li>
              ))}
            </ul>
          )}
        </div>
      )}
    </section>
  );
}
