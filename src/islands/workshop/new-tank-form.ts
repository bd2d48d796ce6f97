import { z } from 'zod/v4';
import { liquids } from '~/domain/liquid/liquids';
import type { TankDocument } from '~/domain/tank/document';
import { tankSettings } from '~/domain/tank/settings';
import { startingPoints } from '~/domain/tank/starting-points';
import { newTank, type NewTank } from '~/domain/tank/tank';

/** The starting point that stands for the draft brought from the front page. */
export const carriedCode = 'carried';

/** The form of a new tank: what is typed, with the words of the server's own schema. */
export const newTankForm = z
  .object({
    installationId: newTank.shape.installationId,
    name: newTank.shape.name,
    liquid: newTank.shape.liquid,
    densityKgPerM3: z.string(),
    startingPoint: z.string().min(1, 'Choose a shape to begin from.'),
  })
  .superRefine(({ liquid, densityKgPerM3 }, context) => {
    if (liquids[liquid].densityKgPerM3 !== null) return;
    const parsed = tankSettings.shape.densityKgPerM3.unwrap().safeParse(numberOf(densityKgPerM3));
    if (!parsed.success) {
      context.addIssue({
        code: 'custom',
        path: ['densityKgPerM3'],
        message: parsed.error.issues[0]!.message,
      });
    }
  });
export type NewTankForm = z.output<typeof newTankForm>;
export type NewTankFields = z.input<typeof newTankForm>;

/** What is sent: a tank with its starting shape, named as the tank is. */
export function newTankOf(form: NewTankForm, carried: TankDocument | null): NewTank {
  const design =
    form.startingPoint === carriedCode && carried !== null
      ? carried
      : startingPoints.find(({ code }) => code === form.startingPoint)?.design;
  return {
    installationId: form.installationId,
    name: form.name,
    liquid: form.liquid,
    ...(design === undefined ? {} : { design: { ...design, name: form.name } }),
    ...(liquids[form.liquid].densityKgPerM3 === null
      ? { settings: { densityKgPerM3: numberOf(form.densityKgPerM3)! } }
      : {}),
  };
}

function numberOf(text: string): number | undefined {
  const trimmed = text.trim().replace(',', '.');
  return /^\d+(\.\d+)?$/.test(trimmed) ? Number(trimmed) : undefined;
}
