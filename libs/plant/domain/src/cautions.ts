import type { Station } from '@seamwright/catalogue/domain';
import type { StationLoad } from './station-time';

/** What a list of work must warn of: knives at the block, or the band-saw. */
export const CAUTIONS = ['knives', 'band-saw'] as const;
export type Caution = (typeof CAUTIONS)[number];

const KNIFE_STATIONS: readonly Station[] = ['boning', 'trimming', 'portioning', 'tying'];

/** The usual cautions for the stations that have work (domain: "Cautions"). */
export function cautionsOf(loads: readonly StationLoad[]): Caution[] {
  const used = new Set(loads.map(({ station }) => station));
  return CAUTIONS.filter((caution) =>
    caution === 'band-saw' ? used.has('band-saw') : KNIFE_STATIONS.some((station) => used.has(station)),
  );
}
