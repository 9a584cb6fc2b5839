import { lineWeights, resolveChoices } from '@seamwright/catalogue/domain';
import { versionsByIds } from '@seamwright/catalogue/server';
import type { QuoteDetail, QuoteListItem } from '@seamwright/pricing/contracts';
import { lineAmounts } from '@seamwright/pricing/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import { linesOfQuote, quoteById, type Quote, type QuoteLine } from './quotes.repository';

const ONE_CASE = { unit: 'case', count: 1 } as const;

function headOf(quote: Quote) {
  const { notes: _notes, writerName: _writer, decidedByName: _decider, createdAt, sentAt, decidedAt, ...head } = quote;
  return {
    ...head,
    createdAt: createdAt.toISOString(),
    sentAt: sentAt?.toISOString() ?? null,
    decidedAt: decidedAt?.toISOString() ?? null,
  };
}

export function presentQuoteInList({ lineCount, ...quote }: Quote & { lineCount: number }): QuoteListItem {
  return { ...headOf(quote), lineCount };
}

/** A quote as both sides see it. The weights and amounts of a case come from the version that was quoted. */
export async function presentQuote(tx: Tx, id: string): Promise<QuoteDetail> {
  const quote = await quoteById(tx, id);
  if (!quote) throw notFound();
  const lines = await linesOfQuote(tx, id);
  return {
    ...headOf(quote),
    notes: quote.notes,
    writtenBy: quote.writerName,
    decidedBy: quote.decidedByName,
    lines: await presentLines(tx, lines),
  };
}

async function presentLines(tx: Tx, lines: readonly QuoteLine[]): Promise<QuoteDetail['lines']> {
  const versions = await versionsByIds(tx, [...new Set(lines.map(({ versionId }) => versionId))]);
  return lines.map(({ versionId, choices, ...line }) => {
    const version = versions.get(versionId);
    if (!version) throw new Error(`Version ${versionId} of a quote is missing`);
    const resolved = unwrap(resolveChoices(version, choices));
    const caseWeights = lineWeights(resolved, ONE_CASE);
    return {
      ...line,
      code: version.code,
      name: version.name,
      summary: resolved.summary,
      chosen: resolved.chosen,
      caseWeights,
      caseAmounts: unwrap(lineAmounts(line.basis, line.priceMinor, caseWeights)),
    };
  });
}
