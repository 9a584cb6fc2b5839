/** An instant as the plant's clock shows it: "30 Nov, 14:05". */
export const instantWords = (instant: string, locale: string): string =>
  new Intl.DateTimeFormat(locale, {
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
    timeZone: 'Europe/London',
  }).format(new Date(instant));
