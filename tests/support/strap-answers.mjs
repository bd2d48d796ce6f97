import { register } from 'tsx/esm/api';

// the same function that the command runs, in a process that can be ended when it hangs
register();
const { runStrap } = await import('../../src/commands/strap/run-strap.ts');

process.on('message', async (args) => {
  const start = process.cpuUsage();
  const outcome = await runStrap(args);
  const { user, system } = process.cpuUsage(start);
  process.send({ outcome, processorMs: (user + system) / 1000 });
});
process.send('ready');
