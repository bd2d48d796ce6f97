import { parentPort } from 'node:worker_threads';
import { register } from 'tsx/esm/api';

// the same function that the command runs, in a thread that can be ended when it hangs
register();
const { runStrap } = await import('../../src/commands/strap/run-strap.ts');

parentPort.on('message', async (args) => {
  parentPort.postMessage(await runStrap(args));
});
parentPort.postMessage('ready');
