import { primalName, type Species } from '@seamwright/catalogue/domain';
import type { LotWire } from '@seamwright/stock/contracts';
import { formatKg, grams, type PlantDate } from '@seamwright/shared/util';
import { daysAhead, inWords } from './plant-day';
import type { Task } from './task';

/** A lot that keeps no longer than so many days wants to be cut now. */
export const SOON_DAYS = 2;

/** Primals by id, for the species that a lot does not tell. */
export type Primals = readonly { readonly id: string; readonly species: Species }[];

const isOver = ({ useBy }: LotWire, today: PlantDate): boolean => useBy !== null && useBy < today;

const lotTask = (lot: LotWire, primals: Primals, locale: string): Omit<Task, 'note' | 'mark'> => {
  const species = primals.find(({ id }) => id === lot.nodeId)?.species;
  return {
    id: lot.id,
    figure: formatKg(grams(lot.remainingGrams), locale),
    unit: $localize`:@@admin.home.kg:kg`,
    text: species ? primalName(species, lot.nodeName) : lot.nodeName,
    link: ['/lots', lot.id],
  };
};

/** Released lots with something left whose use-by is within two days, the first to expire first; over ones come last. */
export const expiringTasks = (lots: readonly LotWire[], primals: Primals, today: PlantDate, locale: string): Task[] =>
  [...lots]
    .sort((a, b) => Number(isOver(a, today)) - Number(isOver(b, today)))
    .flatMap((lot) => {
      if (lot.useBy === null || lot.remainingGrams === 0) return [];
      const ahead = daysAhead(lot.useBy, today);
      if (ahead > SOON_DAYS) return [];
      const mark: Task['mark'] =
        ahead < 0
          ? { tone: 'bad', word: $localize`:@@admin.home.lotOver:Use-by passed` }
          : ahead === 0
            ? { tone: 'eye', word: $localize`:@@admin.home.lotToday:Use today` }
            : {
                tone: 'eye',
                word:
                  ahead === 1
                    ? $localize`:@@admin.home.lotTomorrow:Use by tomorrow`
                    : $localize`:@@admin.home.lotSoon:Use by ${inWords(lot.useBy, locale)}:day:`,
              };
      const note = $localize`:@@admin.home.lotUseBy:${lot.code}:lot: · use by ${inWords(lot.useBy, locale)}:day:`;
      return [{ ...lotTask(lot, primals, locale), note, mark }];
    });

/** Lots that wait for a decision: those just received and those on hold, with the reason. */
export const undecidedTasks = (lots: readonly LotWire[], primals: Primals, locale: string): Task[] =>
  lots.map((lot) => ({
    ...lotTask(lot, primals, locale),
    note: [lot.code, lot.holdReason ?? lot.supplier].join(' · '),
    mark:
      lot.state === 'on-hold'
        ? { tone: 'eye', word: $localize`:@@admin.home.lotHeld:On hold` }
        : { tone: 'info', word: $localize`:@@admin.home.lotNew:To release` },
  }));
