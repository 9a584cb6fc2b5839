import type { SpecificationRow } from '@seamwright/catalogue/contracts';
import { speciesName } from '@seamwright/catalogue/ui';
import type { Task } from './task';

/** Versions that wait for a second pair of eyes. */
export const reviewTasks = (rows: readonly SpecificationRow[]): Task[] =>
  rows
    .filter(({ state }) => state === 'in-review')
    .map(({ code, name, primalName, species, specificationId, version }) => ({
      id: specificationId,
      figure: code,
      text: name,
      note: [speciesName(species), primalName ?? ''].filter((word) => word !== '').join(' · '),
      link: ['/specifications', code],
      mark: { tone: 'eye', word: $localize`:@@admin.home.version:Version ${version}:version:` },
    }));
