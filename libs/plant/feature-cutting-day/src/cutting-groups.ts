import type { CuttingListWire } from '@seamwright/plant/contracts';

type Primal = CuttingListWire['primals'][number];
type Sums = Primal['totals'];

/** The primals of one species with what they come to. */
export interface SpeciesGroup {
  readonly species: Primal['primal']['species'];
  readonly primals: readonly Primal[];
  /** Whole grams and seconds. */
  readonly totals: Pick<Sums, 'pieces' | 'outGrams' | 'inGrams' | 'seconds'>;
}

const NOTHING: SpeciesGroup['totals'] = { pieces: 0, outGrams: 0, inGrams: 0, seconds: 0 };

/** The cutting list by species; species and primals stay in the order in which the list names them. */
export function cuttingGroups(primals: readonly Primal[]): SpeciesGroup[] {
  const groups = new Map<SpeciesGroup['species'], Primal[]>();
  for (const each of primals) groups.set(each.primal.species, [...(groups.get(each.primal.species) ?? []), each]);
  return [...groups].map(([species, ofSpecies]) => ({
    species,
    primals: ofSpecies,
    totals: ofSpecies.reduce(
      (sum, { totals }) => ({
        pieces: sum.pieces + totals.pieces,
        outGrams: sum.outGrams + totals.outGrams,
        inGrams: sum.inGrams + totals.inGrams,
        seconds: sum.seconds + totals.seconds,
      }),
      NOTHING,
    ),
  }));
}
