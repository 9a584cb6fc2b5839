import { lineWeights, resolveChoices, type ResolvedSpecification } from '@seamwright/catalogue/domain';
import { currentVersions, specificationsByCodes } from '@seamwright/catalogue/server';
import { customerById, siteById } from '@seamwright/identity/server';
import type { checkPrices, PricedLine } from '@seamwright/pricing/contracts';
import { HOUSE_CURRENCY, lineAmounts, type PriceAnswer } from '@seamwright/pricing/domain';
import { sayRefusal, type Answer, type CheckedInput } from '@seamwright/shared/contracts';
import { inTransaction, notFound, type Caller, type RequestContext, type Tx } from '@seamwright/shared/server';
import {
  isPlantDate,
  ok,
  plantToday,
  quantity,
  refuse,
  unwrap,
  type PlantDate,
  type Quantity,
  type Refusal,
  type Result,
} from '@seamwright/shared/util';
import { priceFor } from './price-for';

type Check = CheckedInput<typeof checkPrices>['body'];
type AskedLine = Check['lines'][number];

interface ReadyLine {
  readonly resolved: ResolvedSpecification;
  readonly quantity: Quantity;
}

/** Prices many lines for a customer and delivery day, each with its reasons or its refusal in words. */
export async function answerPriceCheck(
  { caller, now, database }: RequestContext,
  timeZone: string,
  check: Check,
): Promise<Answer<typeof checkPrices>> {
  const customerId = unwrap(askedCustomer(caller, check.customerId));
  const deliveryDay = unwrap(dayToCome(check.deliveryDay, plantToday(now, timeZone)));
  return inTransaction(database, caller, async (tx) => {
    await customerById(tx, customerId);
    if (check.siteId !== undefined) await siteById(tx, customerId, check.siteId);
    const ready = await readyLines(tx, check.lines);
    const prices = await priceFor(
      tx,
      customerId,
      ready.flatMap((line) =>
        line.ok ? [{ ...line.value, specificationId: line.value.resolved.version.specificationId, deliveryDay }] : [],
      ),
    );
    let next = 0;
    const lines = ready.map((line): PricedLine => {
      if (!line.ok) return refused(line.refusal);
      const price = prices[next++];
      return price?.ok
        ? priced(line.value, price.value)
        : refused(price?.refusal ?? { code: 'unexpected', params: {} });
    });
    return { customerId, currency: HOUSE_CURRENCY, deliveryDay, lines };
  });
}

/** A buyer asks for her own customer; another one is not hers to see. Staff say which. */
function askedCustomer(caller: Caller, named: string | undefined): Result<string> {
  if (caller.kind !== 'user') return named ? ok(named) : refuse('price-customer-missing', {}, '/customerId');
  if (named !== undefined && named !== caller.customerId) throw notFound();
  return ok(caller.customerId);
}

function dayToCome(day: string, today: PlantDate): Result<PlantDate> {
  if (!isPlantDate(day)) return refuse('date-unreadable', { text: day }, '/deliveryDay');
  return day < today ? refuse('price-day-past', {}, '/deliveryDay') : ok(day);
}

/** Finds the specifications, named by id or code, and applies the choices. */
async function readyLines(tx: Tx, lines: readonly AskedLine[]): Promise<Result<ReadyLine>[]> {
  const ids = lines.flatMap(({ specificationId }) => specificationId ?? []);
  const codes = lines.flatMap(({ code }) => code ?? []);
  const byId = await currentVersions(tx, [...new Set(ids)]);
  const byCode = await specificationsByCodes(tx, [...new Set(codes)]);
  return lines.map(({ specificationId, code, chosen, quantity: ordered }) => {
    const version = specificationId === undefined ? byCode.get(code ?? '') : byId.get(specificationId);
    if (!version) return refuse('specification-not-offered');
    const checked = quantity(ordered);
    if (!checked.ok) return checked;
    const resolved = resolveChoices(version, chosen);
    return resolved.ok ? ok({ resolved: resolved.value, quantity: checked.value }) : resolved;
  });
}

function priced({ resolved, quantity: ordered }: ReadyLine, price: PriceAnswer): PricedLine {
  const weights = lineWeights(resolved, ordered);
  const amounts = lineAmounts(price.basis, price.priceMinor, weights);
  if (!amounts.ok) return refused(amounts.refusal);
  const { version, chosen, choiceKey, summary, leadDays } = resolved;
  return {
    ok: true,
    specificationId: version.specificationId,
    code: version.code,
    name: version.name,
    chosen,
    choiceKey,
    summary,
    weights,
    price: {
      ...price,
      parts: price.parts.map((part) => ({ ...part })),
      candidates: price.candidates.map((candidate) => ({ ...candidate })),
    },
    amounts: amounts.value,
    leadDays,
  };
}

const refused = (refusal: Refusal): PricedLine => ({ ok: false, code: refusal.code, message: sayRefusal(refusal) });
