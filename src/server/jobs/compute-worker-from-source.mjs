import { register } from 'tsx/esm/api';

// `--import tsx` reaches only the main thread: a thread that runs from source registers for itself
register();
const { default: compute } = await import('./compute-worker.ts');

export default compute;
