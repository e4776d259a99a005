// Adds up what the test runners wrote: TRX files of dotnet test, JSON of vitest. Closes with one plain line.
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const [folder, broken] = process.argv.slice(2);
let passed = 0;
let failed = 0;
let sources = 0;
for (const file of readdirSync(folder)) {
  const text = readFileSync(join(folder, file), 'utf8');
  if (file.endsWith('.trx')) {
    const counters = /<Counters [^>]*>/.exec(text)?.[0] ?? '';
    const of = (name) => Number(new RegExp(`\\b${name}="(\\d+)"`).exec(counters)?.[1] ?? 0);
    passed += of('passed');
    failed += of('total') - of('passed');
    sources += 1;
  } else if (file === 'web.json') {
    const result = JSON.parse(text);
    passed += result.numPassedTests;
    failed += result.numTotalTests - result.numPassedTests;
    sources += 1;
  }
}

// A step that broke without a failed test of its own counts as one, so that the line never says all is well.
if (broken !== '0' && failed === 0) failed = 1;
if (sources === 0 || passed === 0) failed += 1;
console.log(`${passed} passed, ${failed} failed`);
process.exit(failed === 0 ? 0 : 1);
