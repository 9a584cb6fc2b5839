// Texts are marked with $localize: it has to be there before anything that says something.
import '@angular/localize/init';
import type { Bench } from './bench';
import { catalogueBench } from './catalogue/catalogue.bench';
import { readWish } from './options';
import { reportLine, table } from './report';
import { runPairs } from './run-pairs';
import { threadBench } from './thread/thread.bench';

const BENCHES: readonly Bench[] = [threadBench, catalogueBench];
const WARM_UPS = 3;

/** Answers go to the standard output, what is going on to the other one. */
const say = (line: string): void => void process.stderr.write(`${line}\n`);

async function run(bench: Bench, turns: number) {
  const ready = await bench.prepare({ turns: WARM_UPS + turns, say });
  try {
    const lines = [];
    for (const each of ready.cases) {
      say(`  ${each.name}`);
      await ready.beforeCase();
      const measured = await runPairs(each, { warmUps: WARM_UPS, turns, clock: () => performance.now() });
      lines.push({ line: reportLine(bench.name, each, measured), measured });
    }
    return lines;
  } finally {
    await ready.close();
  }
}

async function main(): Promise<void> {
  const { names, json, turns } = readWish(
    process.argv.slice(2),
    BENCHES.map(({ name }) => name),
  );
  const all = [];
  for (const bench of BENCHES.filter(({ name }) => names.includes(name))) {
    say(`${bench.name}: ${turns} turns each`);
    const lines = await run(bench, turns);
    if (!json) console.log(`\n${bench.name}\n\n${table(lines)}\n`);
    all.push(...lines.map(({ line }) => line));
  }
  if (json) console.log(JSON.stringify(all, null, 2));
}

main().catch((error: Error) => {
  process.stderr.write(`${error.stack ?? error.message}\n`);
  process.exitCode = 1;
});
