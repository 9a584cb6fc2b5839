import { coverAllRound, coverOnTop } from './fat-cover';
import { areaOf, type Point } from './geometry';
import type { DrawnNumbers } from './drawn-numbers';
import { blockOutline, eyeOutline, legOutline, loinOutline, rollOutline } from './outline';
import { meatWidthOfRack, RIB_SHARE, ribsOfRack } from './views';

/** Grams per cubic millimetre. From memory of published values: lean 1.06, fat 0.92, bone about 1.3 g/cm³. */
const LEAN = 0.00106;
const FAT = 0.00092;
const BONE = 0.0013;
const RIB_THICK_MM = 6;

/**
 * The weight that a piece of these dimensions would have: area × thickness × density of lean and of the fat over it,
 * in whole grams. It stands beside the stated weight to show when a version's own numbers contradict each other; nothing
 * is charged by it. Null for loose cubes, which have no one shape.
 */
export function impliedGrams(numbers: DrawnNumbers): number | null {
  const { lengthMm, widthMm, heightMm, fatCoverMm, finish } = numbers;
  switch (numbers.kind) {
    case 'steak':
      return slab(eyeOutline(lengthMm, widthMm), heightMm, fatCoverMm);
    case 'joint': {
      const across = rollOutline(widthMm, heightMm);
      const cover = finish === 'rolled' ? coverAllRound(across, fatCoverMm) : coverOnTop(across, fatCoverMm);
      // All round, the band is the whole outline: what lies within the lean is not fat.
      const fat = cover ? areaOf(cover.band) - (finish === 'rolled' ? areaOf(across) : 0) : 0;
      // The ends are rounded: the same share is lost that the side view loses at its corners.
      const ends = areaOf(blockOutline(lengthMm, heightMm)) / (lengthMm * heightMm);
      return Math.round((areaOf(across) * LEAN + fat * FAT) * lengthMm * ends);
    }
    case 'rack': {
      const meat = meatWidthOfRack(numbers);
      // Bones stand in the meat as if they were lean; only their bare ends come on top.
      const bare = ribsOfRack(numbers) === 0 ? 0 : (widthMm - meat) * RIB_SHARE * lengthMm * RIB_THICK_MM * BONE;
      return Math.round(slab(loinOutline(meat, heightMm), lengthMm, fatCoverMm) + bare);
    }
    case 'flat': {
      const area = areaOf(blockOutline(lengthMm, widthMm));
      return Math.round(area * (heightMm * LEAN + fatCoverMm * FAT));
    }
    case 'leg':
      return tapered(legOutline(lengthMm, widthMm), numbers);
    case 'dice':
      return null;
  }
}

/** By how much the implied weight is off the stated one, in whole per cent of it; null where nothing is implied. */
export function impliedDifferencePercent(numbers: DrawnNumbers): number | null {
  const implied = impliedGrams(numbers);
  return implied === null ? null : Math.round((100 * (implied - numbers.nominalGrams)) / numbers.nominalGrams) + 0;
}

/** The same face all the way through. */
function slab(face: readonly Point[], thickMm: number, fatCoverMm: number): number {
  const cover = coverOnTop(face, fatCoverMm);
  return Math.round((areaOf(face) * LEAN + (cover ? areaOf(cover.band) : 0) * FAT) * thickMm);
}

/** An elliptic section everywhere, as thick in proportion as the outline is wide there, under fat on its upper half. */
function tapered(outline: readonly Point[], { lengthMm, widthMm, heightMm, fatCoverMm }: DrawnNumbers): number {
  const slices = 100;
  const step = lengthMm / slices;
  let volume = 0;
  for (let slice = 0; slice < slices; slice++) {
    const wide = widthAt(outline, (slice + 0.5) * step);
    volume += (Math.PI / 4) * wide * (wide / widthMm) * heightMm * step;
  }
  return Math.round(volume * LEAN + areaOf(outline) * fatCoverMm * FAT);
}

/** How wide an outline is across x: between the outermost points near it. */
function widthAt(outline: readonly Point[], x: number): number {
  const crossings = outline.flatMap((from, at) => {
    const to = outline[(at + 1) % outline.length] ?? from;
    if (from.x > x === to.x > x) return [];
    return [from.y + ((x - from.x) / (to.x - from.x)) * (to.y - from.y)];
  });
  return crossings.length < 2 ? 0 : Math.max(...crossings) - Math.min(...crossings);
}
