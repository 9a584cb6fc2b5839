import { grams, ppm } from '@seamwright/shared/util';
import type { Cut, CuttingLine } from './cutting-line';

type CutPart = Partial<Omit<Cut, 'primal'>> & { primal?: Partial<Cut['primal']> };

/** A cut for a test: a striploin steak, unless said otherwise. */
export function aCut({ primal, ...over }: CutPart = {}): Cut {
  return {
    versionId: 'v-steak',
    choiceKey: 'trim=6',
    code: 'B-STRIP-STEAK',
    name: 'Striploin steak',
    summary: '280 g · 6 mm fat',
    primal: { id: 'n-striploin', name: 'Striploin', species: 'beef', ...primal },
    pieceNominalGrams: grams(280),
    piecesPerCase: 12,
    yieldPpm: ppm(784_000),
    stations: [
      { station: 'trimming', setUpSeconds: 120, secondsPerKg: 30, secondsPerPiece: 0 },
      { station: 'portioning', setUpSeconds: 60, secondsPerKg: 0, secondsPerPiece: 8 },
    ],
    ...over,
  };
}

/** An order line for a test. */
export function aLine({ cut, ...over }: Partial<Omit<CuttingLine, 'cut'>> & { cut?: CutPart } = {}): CuttingLine {
  return {
    cut: aCut(cut),
    customer: { id: 'c-heron', name: 'The Heron' },
    orderNumber: 1001,
    inCases: false,
    pieces: 10,
    ...over,
  };
}
