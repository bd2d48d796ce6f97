import { dirname, join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { composeContext } from './compose';
import { readConfig } from './config';
import { sendConsoleToLog } from './front/console-to-log';
import { drain } from './front/drain';
import type { DrainState } from './front/drain-state';
import { createFront, type Handler } from './front/front';
import { createHttpServer } from './front/http-server';
import { staticFiles } from './front/static-files';
import { createLog } from './log';

/** The web server of the built product: dist/server/dipwright.mjs. */
const here = dirname(fileURLToPath(import.meta.url));
const log = createLog('info');

try {
  await serve();
} catch (error) {
  const message = error instanceof Error ? error.message : String(error);
  log.error('the web server did not start', { error });
  process.send?.({ fault: message });
  process.exit(1);
}

async function serve(): Promise<void> {
  const config = readConfig({
    ...process.env,
    DIPWRIGHT_COMPUTE_WORKER_FILE:
      process.env.DIPWRIGHT_COMPUTE_WORKER_FILE ?? join(here, 'compute-worker.mjs'),
  });
  const context = await composeContext(config);
  sendConsoleToLog(context.log);
  // A promise that nobody awaited has failed: the request it belonged to is answered or timed out by
  // itself, and others are under way, so the process stays and says what happened.
  process.on('unhandledRejection', (error) => {
    context.log.error('a failure that nothing awaited', { error });
  });
  process.on('uncaughtException', (error) => {
    context.log.error('an error that nothing caught', { error });
    process.exit(1);
  });

  // The framework's own output: known by its name only once it is built.
  const built = (await import(/* @vite-ignore */ pathToFileURL(join(here, 'entry.mjs')).href)) as {
    handler: (...args: [...Parameters<Handler>]) => Promise<void>;
  };
  const handler: Handler = (request, response, next, locals) =>
    built.handler(request, response, next, { ...locals, context, actor: null } as typeof locals);
  const state: DrainState = { leaving: false };
  const files = staticFiles(join(here, '..', 'client'));
  const front = createFront({ config, log: context.log, state, files, handler });
  const server = createHttpServer(
    (request, response) => void front(request, response),
    config.http.tls,
  );

  const leave = async (why: string) => {
    if (state.leaving) return;
    context.log.info('leaving', { why });
    await drain(server, state, config.http);
    await context.close();
    context.log.info('left');
    process.exit(0);
  };
  process.on('SIGTERM', () => void leave('SIGTERM'));
  process.on('SIGINT', () => void leave('SIGINT'));
  // Started by a command that was killed: leave too, so that its port is free again.
  if (process.send)
    process.on('disconnect', () => void leave('the command that started this ended'));

  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(config.http.port, config.http.host, resolve);
  });
  context.log.info('serving', { origin: config.http.origin, mode: config.mode });
  process.send?.({ serving: config.http.origin });
}
