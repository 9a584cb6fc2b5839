import type { Bench, ReadyBench } from '../bench';
import { openCatalogueStage } from './catalogue-stage';
import { drawingCases } from './drawing-cases';
import { searchCases } from './search-cases';

const FILLING = { specifications: 20_000, versionsEach: 10 };

/** Finding and drawing in a catalogue far larger than a house's. */
export const catalogueBench: Bench = {
  name: 'catalogue',
  async prepare({ say }): Promise<ReadyBench> {
    const stage = await openCatalogueStage(FILLING, say);
    try {
      return {
        cases: [...(await searchCases(stage)), ...drawingCases()],
        beforeCase: stage.signIn,
        close: stage.close,
      };
    } catch (error) {
      await stage.close();
      throw error;
    }
  },
};
