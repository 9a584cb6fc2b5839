const formats = new Map<string, Intl.NumberFormat>();

/** `Intl.NumberFormat` by locale and options, kept: making one costs far more than using it. */
export function numberFormat(locale: string, options: Intl.NumberFormatOptions): Intl.NumberFormat {
  const key = `${locale} ${JSON.stringify(options)}`;
  let format = formats.get(key);
  if (format === undefined) {
    format = new Intl.NumberFormat(locale, options);
    formats.set(key, format);
  }
  return format;
}
