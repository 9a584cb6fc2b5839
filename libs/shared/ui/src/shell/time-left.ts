/** A stretch of time as a person would say it: "38 min", "2 h 12 min", "3 days". Whole minutes, never rounded up. */
export function timeLeft(minutes: number): string {
  const hours = Math.floor(minutes / 60);
  if (hours >= 48) {
    return $localize`:@@ui.timeLeft.days:${Math.floor(hours / 24)}:days: days`;
  }
  return hours === 0
    ? $localize`:@@ui.timeLeft.minutes:${minutes}:minutes: min`
    : $localize`:@@ui.timeLeft.hours:${hours}:hours: h ${minutes % 60}:minutes: min`;
}
