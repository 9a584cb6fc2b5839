import type { Station } from '@seamwright/catalogue/domain';
import type { Caution, CuttingDayState } from '@seamwright/plant/domain';

/** The words that screens and papers of the plant share. */
export const stationName = (station: Station): string =>
  ({
    'band-saw': $localize`:@@plant.station.bandSaw:Band-saw`,
    boning: $localize`:@@plant.station.boning:Boning`,
    trimming: $localize`:@@plant.station.trimming:Trimming`,
    portioning: $localize`:@@plant.station.portioning:Portions`,
    tying: $localize`:@@plant.station.tying:Tying`,
    packing: $localize`:@@plant.station.packing:Packing`,
  })[station];

export const cuttingDayStateName = (state: CuttingDayState): string =>
  ({
    open: $localize`:@@plant.day.open:Open`,
    closed: $localize`:@@plant.day.closed:Closed to orders`,
    planned: $localize`:@@plant.day.planned:Planned`,
    released: $localize`:@@plant.day.released:On the floor`,
    finished: $localize`:@@plant.day.finished:Finished`,
    locked: $localize`:@@plant.day.locked:Locked`,
  })[state];

export const cautionWords = (caution: Caution): string =>
  ({
    knives: $localize`:@@plant.caution.knives:Knives: chain-mail glove and apron on, the cut goes away from the body, loose knives go back in the scabbard.`,
    'band-saw': $localize`:@@plant.caution.bandSaw:Band-saw: guard set down to the piece, push block in hand, no gloves near the blade; stop and isolate it before cleaning or clearing.`,
  })[caution];

/** Stands under the cautions wherever they are shown. */
export const cautionScope = (): string =>
  $localize`:@@plant.caution.scope:General guidance: local codes and the competent authority govern, and trained and licensed people decide.`;
