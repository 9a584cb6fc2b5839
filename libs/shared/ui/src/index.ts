// Pieces that any page may show. Tables are in `shared/ui/table`, form pieces in `shared/ui/forms`, the applications'
// frames in `shared/ui/frame`.
export { Card } from './card/card';
export { Chip, type ChipTone } from './chip/chip';
export { Confirm, type ConfirmQuestion } from './confirm/confirm';
export { DatePipe } from './numbers/date.pipe';
export { Empty } from './states/empty';
export { ErrorState } from './states/error';
export { Icon } from './icons/icon';
export type { IconName } from './icons/icon-shapes';
export { Kg } from './numbers/kg';
export { KgPipe } from './numbers/kg.pipe';
export { Ladder, type LadderStep } from './ladder/ladder';
export { Loading } from './states/loading';
export { Money } from './numbers/money';
export { MoneyPipe } from './numbers/money.pipe';
export { PageHead, type Crumb } from './page-head/page-head';
export { PercentPipe } from './numbers/percent.pipe';
export type { FieldProblem, ProblemText } from './states/problem-text';
export { SeamLine, type SeamStage } from './seam-line/seam-line';
export { Stale } from './states/stale';
export { timeLeft } from './shell/time-left';
export { Toast, type ToastMessage } from './toast/toast';
export { Why, type WhyPart } from './why/why';
export { WhyHarness } from './why/why.harness';
