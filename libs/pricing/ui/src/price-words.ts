import type { CandidateOutcome, PriceBasis, PriceLevel, QuoteState } from '@seamwright/pricing/domain';

/** What a price is for, after a stroke: "£14.20/kg". */
export function basisWord(basis: PriceBasis): string {
  switch (basis) {
    case 'kg':
      return $localize`:@@pricing.basis.kg:kg`;
    case 'piece':
      return $localize`:@@pricing.basis.piece:piece`;
    case 'case':
      return $localize`:@@pricing.basis.case:case`;
  }
}

/** Whose a price is. */
export function levelWord(level: PriceLevel): string {
  switch (level) {
    case 'agreement':
      return $localize`:@@pricing.level.agreement:Agreement`;
    case 'customer':
      return $localize`:@@pricing.level.customer:Customer's list`;
    case 'group':
      return $localize`:@@pricing.level.group:Group's list`;
    case 'base':
      return $localize`:@@pricing.level.base:Base list`;
  }
}

/** What became of a price that was considered. */
export function outcomeWord(outcome: CandidateOutcome): string {
  switch (outcome) {
    case 'won':
      return $localize`:@@pricing.outcome.won:used: the most specific in force`;
    case 'lost-to-more-specific':
      return $localize`:@@pricing.outcome.lost:a more specific price is in force`;
    case 'not-in-force':
      return $localize`:@@pricing.outcome.notInForce:not in force on the delivery day`;
    case 'other-choices':
      return $localize`:@@pricing.outcome.otherChoices:agreed for other choices`;
  }
}

export function quoteStateWord(state: QuoteState): string {
  switch (state) {
    case 'draft':
      return $localize`:@@pricing.quote.draft:Draft`;
    case 'sent':
      return $localize`:@@pricing.quote.sent:Sent`;
    case 'accepted':
      return $localize`:@@pricing.quote.accepted:Accepted`;
    case 'declined':
      return $localize`:@@pricing.quote.declined:Declined`;
    case 'expired':
      return $localize`:@@pricing.quote.expired:Expired`;
  }
}
