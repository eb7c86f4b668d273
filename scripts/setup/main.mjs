import { say, SetupError } from './say.mjs';
import { isStopping, shutDown, stopOnSignals } from './shutdown.mjs';

const OLDEST_NODE = [20, 19, 4];

/**
 * Runs a command's `job`, tells what went wrong, and always stops what it started.
 * @param job returns the exit code
 * @param exitCodeOnSignal the exit code when somebody stops it
 */
export async function main(job, exitCodeOnSignal) {
  stopOnSignals(exitCodeOnSignal);
  try {
    refuseOldNode();
    const code = await job();
    await shutDown();
    process.exit(code);
  } catch (error) {
    if (isStopping()) return; // what was cut short complains; the signal's handler ends us
    say(error instanceof SetupError ? `\n${error.message}` : error.stack);
    await shutDown();
    process.exit(1);
  }
}

function refuseOldNode() {
  const version = process.versions.node.split('.').map(Number);
  const differs = version.findIndex((part, index) => part !== OLDEST_NODE[index]);
  if (differs >= 0 && version[differs] < OLDEST_NODE[differs]) {
    throw new SetupError(`Matside needs Node ${OLDEST_NODE.join('.')} or newer; this is Node
${process.versions.node}. Its authors use 20.20.2.`);
  }
}
