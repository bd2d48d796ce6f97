import type { Operation } from '../http/operation';
import { meshOperations } from './operations/meshes';
import { readingOperations } from './operations/readings';
import { revisionOperations } from './operations/revisions';
import { serviceOperations } from './operations/service';
import { sessionOperations } from './operations/session';
import { tankOperations } from './operations/tanks';
import { workshopOperations } from './operations/workshop';

/** Every call that the server answers: the routes check by these, the document is made of them. */
export const operations: readonly Operation[] = [
  sessionOperations,
  workshopOperations,
  tankOperations,
  meshOperations,
  readingOperations,
  revisionOperations,
  serviceOperations,
].flatMap((group) => Object.values(group) as Operation[]);
