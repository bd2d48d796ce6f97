import type { Sequelize } from 'sequelize';
import { defineDraft } from './draft';
import { defineHandover } from './handover';
import { defineInstallation } from './installation';
import { defineMembership } from './membership';
import { defineMesh } from './mesh';
import { defineReading } from './reading';
import { defineRevision } from './revision';
import { defineSession } from './session';
import { defineSignInAttempt } from './sign-in-attempt';
import { defineStrappingRow } from './strapping-row';
import { defineTank } from './tank';
import { defineUser } from './user';
import { defineWorkshop } from './workshop';

/** Every table of the program, bound to one connection. */
export function defineModels(sequelize: Sequelize) {
  return {
    workshops: defineWorkshop(sequelize),
    users: defineUser(sequelize),
    memberships: defineMembership(sequelize),
    sessions: defineSession(sequelize),
    signInAttempts: defineSignInAttempt(sequelize),
    installations: defineInstallation(sequelize),
    tanks: defineTank(sequelize),
    drafts: defineDraft(sequelize),
    revisions: defineRevision(sequelize),
    strappingRows: defineStrappingRow(sequelize),
    handovers: defineHandover(sequelize),
    meshes: defineMesh(sequelize),
    readings: defineReading(sequelize),
  };
}

export type Models = ReturnType<typeof defineModels>;
