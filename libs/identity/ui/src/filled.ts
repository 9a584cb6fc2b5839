/** What was typed, or null where nothing was. */
export function filled(text: string): string | null {
  const typed = text.trim();
  return typed === '' ? null : typed;
}
