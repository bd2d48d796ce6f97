import { loadManifold } from '~/geometry/manifold';
import { growth } from './growth';
import { ratios } from './ratios';
import { tables } from './tables';

/**
 * npm run bench: what the engine costs, measured against the mesh library's own way (cut off what is above,
 * ask for the volume) on the same mesh in the same run. Exits 1 when a limit is missed.
 */
await loadManifold();
const met = [await ratios(), growth(), await tables()];
if (met.includes(false)) {
  console.log('A limit was missed.');
  process.exitCode = 1;
}
