import { pathToFileURL } from 'node:url';

// Runs one measurement: a file that exports `name` and `run({ pgUrl })`, which returns lines of text; what it compares
// with and does not find on this machine it names in a line of its own.
const [file] = process.argv.slice(2);
const measurement = await import(pathToFileURL(file).href);
try {
  const lines = await measurement.run({ pgUrl: process.env.HACKLEBOOK_TEST_PG });
  console.log([measurement.name, ...lines.map((line) => `  ${line}`)].join('\n'));
  process.exit(0);
} catch (error) {
  console.log(`${measurement.name}: ${error.message}`);
  process.exit(1);
}
