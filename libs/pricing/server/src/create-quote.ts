import { resolveChoices } from '@seamwright/catalogue/domain';
import { currentVersions } from '@seamwright/catalogue/server';
import { customerById, personById } from '@seamwright/identity/server';
import type { createQuote } from '@seamwright/pricing/contracts';
import { checkQuoteDates, checkQuotedPrices, type QuoteDates } from '@seamwright/pricing/domain';
import type { CheckedInput } from '@seamwright/shared/contracts';
import { personOf, type Caller, type Tx } from '@seamwright/shared/server';
import { newId, ok, plantDate, plantToday, refuse, RefusalError, unwrap, type Result } from '@seamwright/shared/util';
import { addQuote, type QuoteLine } from './quotes.repository';

type Written = CheckedInput<typeof createQuote>['body'];

/** Writes a draft: each line's choices are resolved against the version that is current now. Gives its id. */
export async function writeQuote(
  tx: Tx,
  { now, caller, timeZone }: { readonly now: Date; readonly caller: Caller; readonly timeZone: string },
  written: Written,
): Promise<string> {
  const writtenBy = personOf(caller);
  if (writtenBy === null) throw new RefusalError({ code: 'not-allowed', params: {} });
  await customerById(tx, written.customerId);
  const dates = unwrap(checkQuoteDates(datesOf(written), plantToday(now, timeZone)));
  const lines = await resolvedLines(tx, written.lines);
  unwrap(checkQuotedPrices(lines));
  const { name: writerName } = await personById(tx, writtenBy);
  const id = newId();
  const { customerId, notes } = written;
  await addQuote(tx, { id, customerId, ...dates, notes, writtenBy, writerName, createdAt: now }, lines);
  return id;
}

const datesOf = ({ pricesFrom, pricesUntil, answerBy }: Written): QuoteDates => ({
  pricesFrom: unwrap(plantDate(pricesFrom)),
  pricesUntil: unwrap(plantDate(pricesUntil)),
  answerBy: unwrap(plantDate(answerBy)),
});

async function resolvedLines(tx: Tx, lines: Written['lines']): Promise<QuoteLine[]> {
  const versions = await currentVersions(tx, [...new Set(lines.map(({ specificationId }) => specificationId))]);
  return lines.map(({ specificationId, chosen, basis, priceMinor }, at) => {
    const version = versions.get(specificationId);
    const resolved = version
      ? resolveChoices(version, chosen)
      : refuse('specification-not-offered', {}, '/specificationId');
    const { version: taken, chosen: choices, choiceKey } = unwrap(pointedAt(`/lines/${at}`, resolved));
    return { id: newId(), specificationId, versionId: taken.id, choices, choiceKey, basis, priceMinor };
  });
}

/** A refusal of one line, pointing into the whole of what was sent. */
function pointedAt<T>(at: string, result: Result<T>): Result<T> {
  if (result.ok) return ok(result.value);
  const { code, params, pointer } = result.refusal;
  return refuse(code, params, `${at}${pointer?.replace(/^\/choices/, '/chosen') ?? ''}`);
}
