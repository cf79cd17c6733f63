#!/usr/bin/env node
import { readFileSync } from 'node:fs';

const usage = `Usage: steelyard-calc <appraise|explain> <request.json|-> [--lines]

  appraise   the appraisal of a request: sizes, power, money, months, cautions
  explain    the working of a request, step by step

  -          reads the request from standard input
  --lines    answers an array of requests with one JSON line each
`;

function fail(error) {
  process.stderr.write(`${JSON.stringify({ error })}\n`);
  process.exit(2);
}

const words = process.argv.slice(2);
const lines = words.includes('--lines');
const [command, file, ...rest] = words.filter((word) => word !== '--lines');
if (words.includes('--help') || words.includes('-h')) {
  process.stdout.write(usage);
  process.exit(0);
}
if (!['appraise', 'explain'].includes(command ?? '') || file === undefined || rest.length > 0) {
  fail({ code: 'schema', path: '', message: usage });
}

const calc = await import('../dist/index.js').catch(() => {
  process.stderr.write('The calculation is not built yet: run "npm run build -w @steelyard/calc" first.\n');
  process.exit(1);
});

let input;
try {
  input = JSON.parse(readFileSync(file === '-' ? 0 : file, 'utf8'));
} catch (error) {
  fail({ code: 'schema', path: '', message: `The request cannot be read as JSON: ${error.message}` });
}

function answer(request, index) {
  try {
    return calc[command](request);
  } catch (error) {
    if (!(error instanceof calc.CalcError)) throw error;
    const { code, path, message } = error;
    return fail({ code, path: index === undefined ? path : `${index}.${path}`, message });
  }
}

if (Array.isArray(input)) {
  const answers = input.map(answer);
  process.stdout.write(
    lines
      ? answers.map((each) => `${JSON.stringify(each)}\n`).join('')
      : `${JSON.stringify(answers, null, 2)}\n`,
  );
} else {
  process.stdout.write(`${JSON.stringify(answer(input), null, lines ? 0 : 2)}\n`);
}
