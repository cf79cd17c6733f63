import process from 'node:process';

const secondsBetweenLines = 10;

/** Says what is being done while `work` does it: in place on a terminal, a line every ten seconds elsewhere. */
export async function during(label, work) {
  const started = Date.now();
  const terminal = process.stdout.isTTY === true;
  const elapsed = () => Math.round((Date.now() - started) / 1000);
  process.stdout.write(`${label} …${terminal ? '' : '\n'}`);
  const heartbeat = setInterval(
    () => process.stdout.write(terminal ? `\r\x1b[2K${label} … ${elapsed()} s` : `  … ${elapsed()} s\n`),
    (terminal ? 1 : secondsBetweenLines) * 1000,
  );
  try {
    return await work();
  } finally {
    clearInterval(heartbeat);
    const took = ((Date.now() - started) / 1000).toFixed(1);
    process.stdout.write(terminal ? `\r\x1b[2K${label}: ${took} s\n` : `  ${took} s\n`);
  }
}

/** A failure that a person can mend: its message says how, so no stack is shown. */
export class Remedy extends Error {}

/** Runs a script's main function; a `Remedy` ends it with its sentence alone. */
export async function runScript(main) {
  stopWithNpm();
  try {
    await main();
  } catch (error) {
    if (!(error instanceof Remedy)) throw error;
    process.stderr.write(`\n${error.message}\n`);
    process.exitCode = 1;
  }
}

/** npm passes a signal to the shell between it and this process, and that shell dies without passing it on. */
function stopWithNpm() {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  const watch = () => process.ppid === parent || process.kill(process.pid, 'SIGTERM');
  setInterval(watch, 500).unref();
}
