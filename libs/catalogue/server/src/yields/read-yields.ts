import * as z from 'zod';
import type { CuttingTestWire, YieldsAnswer } from '@seamwright/catalogue/contracts';
import {
  awaitingVerdict,
  cutCost,
  subjectOf,
  yieldsOf,
  type GroupYield,
  type OutputYield,
  type SchemeOutput,
  type YieldEstimate,
} from '@seamwright/catalogue/domain';
import { pageFrom, readCursor, type Tx } from '@seamwright/shared/server';
import {
  addFractions,
  fraction,
  roundFraction,
  subtractFractions,
  toSafeNumber,
  type Fraction,
} from '@seamwright/shared/util';
import { pageOfTests, testsOf } from './cutting-tests.repository';
import { presentTests } from './record-tests';
import { studentT } from './student-t';
import { subjectByCode } from './subjects';

/** The yields of a subject by its tests, and what its joint products cost at a price for the input. */
export async function readYields(tx: Tx, code: string, inputMinorPerKg?: number): Promise<YieldsAnswer> {
  const { id, kind, step, version } = await subjectByCode(tx, code);
  const tests = await testsOf(tx, { kind, id });
  const yields = yieldsOf(subjectOf(step), tests, studentT);
  const byId = new Map(tests.map((test) => [test.id, test]));
  const stated = new Map(step.outputs.map(({ key, yieldPpm }) => [key, yieldPpm]));
  return {
    subject: code,
    name: step.name,
    version,
    outputs: yields.map(({ key, name, kind: of, measured, byGrade, bySupplier, points }) => ({
      key,
      name,
      kind: of,
      statedPpm: stated.get(key) ?? 0,
      measured: measured && shownEstimate(measured),
      byGrade: byGrade.map(shownGroup),
      bySupplier: bySupplier.map(shownGroup),
      points: points.flatMap((point) => {
        const test = byId.get(point.testId);
        if (!test) return [];
        const { testedOn, supplier, grade, inputGrams } = test;
        return [{ ...point, testedOn, supplier, grade, inputGrams }];
      }),
    })),
    awaiting: awaitingVerdict(yields, tests),
    cost: inputMinorPerKg === undefined ? null : costOf(yields, step.outputs, inputMinorPerKg),
  };
}

const shownEstimate = ({ exact: _exact, interval, ...rest }: YieldEstimate) => ({
  ...rest,
  interval: interval && { ...interval },
});
const shownGroup = ({ name, estimate }: GroupYield) => ({ name, ...shownEstimate(estimate) });

/** One kilogram of input: joint products are what is usable, the rest is credited at its value. */
function costOf(
  yields: readonly OutputYield[],
  outputs: readonly SchemeOutput[],
  inputMinorPerKg: number,
): YieldsAnswer['cost'] {
  const values = new Map(outputs.map(({ key, valueMinorPerKg }) => [key, valueMinorPerKg]));
  const one = fraction(1n);
  const measured = yields.flatMap(({ key, kind, measured: estimate }) =>
    estimate ? [{ key, kind, weight: estimate.exact }] : [],
  );
  const usable = measured
    .filter(({ kind }) => kind === 'joint-product')
    .reduce((sum, { weight }) => addFractions(sum, weight), fraction(0n));
  if (usable.n === 0n) return null;
  const parts = measured
    .filter(({ kind }) => kind !== 'joint-product')
    .map(({ key, weight }) => ({ weight, value: fraction(BigInt(values.get(key) ?? 0)) }));
  const out = parts.reduce((sum, { weight }) => addFractions(sum, weight), usable);
  const loss = { weight: subtractFractions(one, out), value: fraction(0n) };
  const cost = cutCost({ weight: one, price: fraction(BigInt(inputMinorPerKg)), parts: [...parts, loss] });
  return {
    inputMinorPerKg,
    usablePpm: rounded(cost.yield, 1_000_000n),
    creditMinorPerKg: rounded(cost.credit),
    usableMinorPerKg: rounded(cost.usableCost),
    factorPpm: rounded(cost.factor, 1_000_000n),
  };
}

const rounded = ({ n, d }: Fraction, times = 1n): number => toSafeNumber(roundFraction({ n: n * times, d }, 'half-up'));

/** A page of a subject's tests, newest first. */
export async function listTests(
  tx: Tx,
  {
    subject: code,
    cursor,
    limit,
  }: { readonly subject: string; readonly cursor?: string | undefined; readonly limit: number },
): Promise<{ items: CuttingTestWire[]; nextCursor: string | null }> {
  const subject = await subjectByCode(tx, code);
  const after = cursor ? readCursor(cursor, z.tuple([z.iso.date(), z.uuid()])) : null;
  const rows = await pageOfTests(tx, subject, { after, limit: limit + 1 });
  const shown = new Map((await presentTests(tx, subject, rows)).map((test) => [test.id, test]));
  const page = pageFrom(
    rows,
    limit,
    ({ testedOn, id }) => [testedOn, id],
    ({ id }) => shown.get(id),
  );
  return { ...page, items: page.items.flatMap((test) => (test ? [test] : [])) };
}
