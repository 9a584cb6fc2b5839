/** ISO weekdays with their short names: 1 Monday to 7 Sunday. 5 January 1970 was a Monday. */
export const weekdayNames = (locale: string): readonly { day: number; name: string }[] => {
  const format = new Intl.DateTimeFormat(locale, { weekday: 'short', timeZone: 'UTC' });
  return Array.from({ length: 7 }, (_, at) => ({
    day: at + 1,
    name: format.format(new Date(Date.UTC(1970, 0, 5 + at))),
  }));
};
