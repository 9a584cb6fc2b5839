import { drawnNumbers, resolveChoices, specDrawing } from '@seamwright/catalogue/domain';
import { aVersion } from '@seamwright/catalogue/domain/testing';
import { unwrap } from '@seamwright/shared/util';
import { SPECIFICATIONS } from '../../../seeds/catalogue';
import type { BenchCase } from '../bench';

const MOST_MS = 2;
const FRAME = { widthMm: 180, heightMm: 90, textMm: 3 };

/** A drawing from a version's numbers with its usual choices; another specification each turn. */
export function drawingCases(): BenchCase[] {
  const versions = SPECIFICATIONS.map(({ cut: _cut, source: _source, ...content }) => aVersion(content));
  return [
    {
      name: `drawing, under ${MOST_MS} ms`,
      size: `${versions.length} specifications in turn`,
      limitMs: MOST_MS,
      ours: (turn) => {
        const version = versions[turn % versions.length];
        return version && specDrawing(drawnNumbers(unwrap(resolveChoices(version, {}))), FRAME);
      },
    },
  ];
}
