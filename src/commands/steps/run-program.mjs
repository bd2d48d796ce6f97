import { spawn } from 'node:child_process';

const running = new Set();

/** Ends whatever `runProgram` started and that still runs. */
export function endRunningPrograms() {
  for (const child of running) child.kill('SIGTERM');
}

/**
 * Runs a program of the checkout to its end.
 * @param {string} program
 * @param {string[]} args
 * @param {{ cwd: string, env?: Record<string, string | undefined>, show?: boolean }} options
 *   `show`: its output goes to the terminal as it comes, otherwise it is kept
 * @returns {Promise<{ code: number, output: string }>}
 */
export function runProgram(program, args, { cwd, env = {}, show = false }) {
  return new Promise((resolve) => {
    const child = spawn(program, args, {
      cwd,
      env: { ...process.env, ASTRO_TELEMETRY_DISABLED: '1', ...env },
      stdio: show ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
    });
    running.add(child);
    const parts = [];
    child.stdout?.on('data', (part) => parts.push(part));
    child.stderr?.on('data', (part) => parts.push(part));
    const text = () => Buffer.concat(parts).toString('utf8');
    child.once('error', (error) => resolve({ code: 127, output: `${text()}\n${error.message}` }));
    child.once('close', (code, signal) => {
      running.delete(child);
      resolve({ code: code ?? 1, output: signal ? `${text()}\n${signal}` : text() });
    });
  });
}
