import type { MapRegion } from '@seamwright/catalogue/domain';

const WAYS: Readonly<Record<string, readonly [x: number, y: number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

/** How much a region beside the way counts against one straight ahead. */
const ASIDE = 2;

/**
 * The region that an arrow key leads to from another: the nearest that lies that way, one straight ahead before one
 * beside. Null for another key, or when nothing lies there.
 */
export function regionTowards(regions: readonly MapRegion[], from: string, key: string): string | null {
  const way = WAYS[key];
  const start = regions.find((region) => region.key === from);
  if (!way || !start) return null;
  const [wayX, wayY] = way;
  const reached = regions.flatMap((region) => {
    const [dx, dy] = [region.label.x - start.label.x, region.label.y - start.label.y];
    const ahead = dx * wayX + dy * wayY;
    const aside = Math.abs(dx * wayY) + Math.abs(dy * wayX);
    return ahead > 0 && region !== start ? [{ key: region.key, far: ahead + ASIDE * aside }] : [];
  });
  return reached.sort((a, b) => a.far - b.far)[0]?.key ?? null;
}
