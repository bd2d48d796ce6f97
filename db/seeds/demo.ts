import type { Context } from '../../src/server/context';
import { addInstallation } from './add-installation';
import { addTank } from './add-tank';
import { addWorkshop, type Team } from './add-workshop';
import { demoInstallations } from './demo-tanks';

export const demoPassword = 'true-litres-2026';

/** The demo workshop: its people, what it fitted, tables issued and dips taken. May be broken off and begun again. */
export async function seedDemo(context: Context): Promise<Team> {
  const team = await addWorkshop(context, {
    name: 'Tarnside Outfitters',
    password: demoPassword,
    people: {
      manager: { name: 'Maren Holt', email: 'manager@tarnside.example' },
      designer: { name: 'Idris Vaughan', email: 'designer@tarnside.example' },
      fitter: { name: 'Tove Lindqvist', email: 'fitter@tarnside.example' },
      owner: { name: 'Callum Reyes', email: 'owner@tarnside.example' },
    },
  });
  for (const { name, kind, tanks } of demoInstallations) {
    const installation = await addInstallation(context, team.designer, { name, kind });
    for (const story of tanks) await addTank(context, team, installation, story);
  }
  return team;
}
