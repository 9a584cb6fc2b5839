/** Markup that is safe to send: made by {@link html}, which escapes every value put into it. */
export class Markup {
  constructor(readonly source: string) {}
}

type Part = Markup | string | number | null | undefined | false | readonly Part[];

const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Escapes text for an element's content or a quoted attribute. */
export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => entities[character] ?? character);
}

function render(part: Part): string {
  if (part === null || part === undefined || part === false) return '';
  if (part instanceof Markup) return part.source;
  if (typeof part === 'string') return escapeHtml(part);
  if (typeof part === 'number') return String(part);
  return part.map(render).join('');
}

/** Template tag: values are escaped unless they are markup themselves; lists are joined, `false` and `null` vanish. */
export function html(strings: TemplateStringsArray, ...values: Part[]): Markup {
  return new Markup(strings.reduce((text, string, index) => text + render(values[index - 1]) + string));
}
