/** Markup that is safe to send as it stands. Only `html` and `raw` make it. */
export class Markup {
  constructor(readonly text: string) {}
  toString(): string {
    return this.text;
  }
}

type Part = Markup | string | number | null | undefined | false | readonly Part[];

const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => entities[sign] ?? sign);
}

function render(part: Part): string {
  if (part === null || part === undefined || part === false) return '';
  if (part instanceof Markup) return part.text;
  if (typeof part === 'string' || typeof part === 'number') return escapeHtml(String(part));
  return part.map(render).join('');
}

/** Escapes everything put into it except other markup; put values in text or inside double quotes only. */
export function html(strings: TemplateStringsArray, ...parts: Part[]): Markup {
  return new Markup(strings.reduce((text, string, i) => text + string + render(parts[i]), ''));
}
