import type { SentForm } from '../shared/use-sent-form';
import type { NewTankFields, NewTankForm } from './new-tank-form';
import { Silhouette, type SilhouetteDrawing } from './Silhouette';

/** A shape to begin from; its design stays with the form. */
export interface Shape {
  code: string;
  label: string;
  words: string;
  drawing: SilhouetteDrawing | null;
}

/** The shapes to begin from, each drawn from the side. */
export function StartingPointChoice({
  of,
  shapes,
}: {
  of: SentForm<NewTankFields, NewTankForm>;
  shapes: readonly Shape[];
}) {
  const id = of.fieldId('startingPoint');
  const fault = of.faultOf('startingPoint');
  return (
    <fieldset aria-describedby={fault ? `${id}-fault` : undefined}>
      <legend className="label">Begin from</legend>
      <ul className="mt-1 grid grid-cols-2 gap-2 sm:grid-cols-3 lg:grid-cols-5">
        {shapes.map(({ code, label, words, drawing }, index) => (
          <li key={code}>
            <label className="flex h-full flex-col gap-2 rounded border border-hair p-3 has-checked:border-ink has-checked:bg-wash has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-ink">
              <Silhouette drawing={drawing} className="h-14 w-full" />
              <span className="flex items-baseline gap-2">
                <input
                  {...of.form.register('startingPoint')}
                  {...(index === 0 ? { id } : {})}
                  type="radio"
                  value={code}
                  className="accent-ink"
                />
                <span>
                  {label}
                  {words && <span className="label block">{words}</span>}
                </span>
              </span>
            </label>
          </li>
        ))}
      </ul>
      {fault && (
        <p id={`${id}-fault`} className="fault mt-1">
          {fault}
        </p>
      )}
    </fieldset>
  );
}
