import type { NewTest } from '@seamwright/catalogue/contracts';
import type { CuttingTestContent } from '@seamwright/catalogue/domain';
import { grams, plantDate, unwrap } from '@seamwright/shared/util';

/** A test as it came over the wire, in the domain's units. */
export const cuttingTestOf = ({ input, outputs, testedOn, note }: Omit<NewTest, 'subject'>): CuttingTestContent => ({
  input: { ...input, grams: grams(input.grams), addedGrams: grams(input.addedGrams) },
  outputs: outputs.map((output) => ({ key: output.key, grams: grams(output.grams) })),
  testedOn: unwrap(plantDate(testedOn)),
  note,
});
