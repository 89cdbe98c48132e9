const ENTITIES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' }

/** Text that is safe inside SVG and its attributes. */
export function svgText(text: string): string {
  return text.replace(/[&<>"]/g, (mark) => ENTITIES[mark] ?? mark)
}

/** A coordinate with no more digits than a page can show. */
export const at = (value: number): string => String(Math.round(value * 100) / 100)
