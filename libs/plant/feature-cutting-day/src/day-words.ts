import { cuttingDayStateName, type CuttingDayWire } from '@seamwright/plant/contracts';
import type { DayDeed } from '@seamwright/plant/data-access';
import { CUTTING_DAY_STATES } from '@seamwright/plant/domain';
import type { ChipTone, ConfirmQuestion, SeamStage } from '@seamwright/shared/ui';

/** A time on the plant's clock. */
function clockTime(instant: string | null, timeZone: string, locale: string): string | undefined {
  if (instant === null) return undefined;
  return new Intl.DateTimeFormat(locale, { hour: '2-digit', minute: '2-digit', timeZone }).format(new Date(instant));
}

/** The day's states as knots, with the time at which each was reached. */
export function dayStages(day: CuttingDayWire, locale: string): SeamStage[] {
  const now = CUTTING_DAY_STATES.indexOf(day.state);
  const reached: Partial<Record<CuttingDayWire['state'], string | null>> = {
    closed: day.closedAt,
    released: day.releasedAt,
    finished: day.finishedAt,
  };
  return CUTTING_DAY_STATES.map((state, index) => {
    const note = clockTime(reached[state] ?? null, day.timeZone, locale);
    return {
      label: cuttingDayStateName(state),
      ...(note === undefined ? {} : { note }),
      state: index < now ? 'passed' : index === now ? 'now' : 'ahead',
    };
  });
}

export const dayTone = (state: CuttingDayWire['state']): ChipTone =>
  state === 'open' ? 'plain' : state === 'finished' || state === 'locked' ? 'ok' : 'info';

/** What the planner can do next with a day; null when it is over. */
export function nextDeed({ state }: Pick<CuttingDayWire, 'state'>): DayDeed | null {
  switch (state) {
    case 'open':
      return 'close';
    case 'closed':
    case 'planned':
      return 'release';
    case 'released':
      return 'finish';
    default:
      return null;
  }
}

export const deedName = (deed: DayDeed): string =>
  ({
    close: $localize`:@@cuttingDay.deed.close:Close to orders`,
    release: $localize`:@@cuttingDay.deed.release:Send to the floor`,
    finish: $localize`:@@cuttingDay.deed.finish:Finish the day`,
  })[deed];

export const deedDone = (deed: DayDeed): string =>
  ({
    close: $localize`:@@cuttingDay.done.close:The day is closed to orders.`,
    release: $localize`:@@cuttingDay.done.release:The list is on the floor.`,
    finish: $localize`:@@cuttingDay.done.finish:The day is finished.`,
  })[deed];

/** What is asked before each: none of them can be taken back. */
export function deedQuestion(deed: DayDeed, { orders, waitingOrders }: CuttingDayWire): ConfirmQuestion {
  const back = $localize`:@@cuttingDay.ask.back:Not yet`;
  const act = deedName(deed);
  switch (deed) {
    case 'close':
      return {
        heading: $localize`:@@cuttingDay.ask.close:Close this day to orders?`,
        text:
          waitingOrders > 0
            ? $localize`:@@cuttingDay.ask.closeWaiting:No more orders are taken for it. ${orders - waitingOrders}:confirmed: confirmed orders are released; ${waitingOrders}:waiting: still wait and follow once they are confirmed.`
            : $localize`:@@cuttingDay.ask.closeText:No more orders are taken for it, and its ${orders}:orders: orders are released.`,
        act,
        back,
      };
    case 'release':
      return {
        heading: $localize`:@@cuttingDay.ask.release:Send this list to the floor?`,
        text: $localize`:@@cuttingDay.ask.releaseText:The list by simple yield becomes the plan, and packing can begin.`,
        act,
        back,
      };
    case 'finish':
      return {
        heading: $localize`:@@cuttingDay.ask.finish:Finish this day?`,
        text: $localize`:@@cuttingDay.ask.finishText:Nothing more can be packed for it afterwards.`,
        act,
        back,
      };
  }
}

/** "2 cases + 5", "1 case", "5 loose". */
export function casesWords({ cases, loosePieces }: { readonly cases: number; readonly loosePieces: number }): string {
  if (cases === 0) return $localize`:@@cuttingDay.cases.loose:${loosePieces}:pieces: loose`;
  const whole =
    cases === 1
      ? $localize`:@@cuttingDay.cases.one:1 case`
      : $localize`:@@cuttingDay.cases.whole:${cases}:cases: cases`;
  return loosePieces === 0 ? whole : `${whole} + ${loosePieces}`;
}
