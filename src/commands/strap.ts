import { runStrap } from './strap/run-strap';

/** npm run --silent strap -- FILE [--step MM | --at MM,MM,…] [--csv] */
const { stdout, stderr, exitCode } = await runStrap(process.argv.slice(2));
process.stdout.write(stdout);
process.stderr.write(stderr);
process.exitCode = exitCode;
