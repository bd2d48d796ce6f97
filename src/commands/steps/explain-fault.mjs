import { StartFault } from '../../../db/local/start-fault.mjs';
import { endRunningPrograms } from './run-program.mjs';

/**
 * Any error of a command as one sentence and a next step, without a stack.
 * @param {unknown} error
 * @returns {{ sentence: string, nextStep: string }}
 */
export function explainFault(error) {
  if (error instanceof StartFault) return { sentence: error.message, nextStep: error.nextStep };
  const place = error?.path ? ` (${error.path})` : '';
  switch (error?.code) {
    case 'ENOSPC':
    case 'EDQUOT':
      return {
        sentence: `The disk is full${place}.`,
        nextStep: 'Free at least 1 GB, then run the command again. The data is kept.',
      };
    case 'EACCES':
    case 'EPERM':
      return {
        sentence: `This account lacks a right that is needed${place}.`,
        nextStep:
          'Run the command as the account that owns this checkout, or give that right, then run it again.',
      };
    case 'EROFS':
      return {
        sentence: `The disk may only be read${place}.`,
        nextStep: 'Put the checkout on a disk that may be written, then run the command again.',
      };
    default:
      return {
        sentence: `Something unforeseen went wrong: ${error?.message ?? String(error)}`,
        nextStep:
          'Run the command again; if it repeats, set DIPWRIGHT_SHOW_STACK=1 to see where it comes from.',
      };
  }
}

/**
 * Runs a command and, when it fails, prints the sentence and the next step and sets the exit code.
 * @param {() => Promise<void>} command
 */
export async function runCommand(command) {
  try {
    await command();
  } catch (error) {
    const { sentence, nextStep } = explainFault(error);
    process.stderr.write(`\n${sentence}\n${nextStep}\n`);
    if (process.env.DIPWRIGHT_SHOW_STACK) process.stderr.write(`${error?.stack ?? ''}\n`);
    process.exitCode = 1;
  } finally {
    endRunningPrograms();
  }
  process.exit();
}
