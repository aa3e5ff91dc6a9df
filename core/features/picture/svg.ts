/**
 * The few SVG elements that pictures are made of, as text. Every string from outside is escaped here.
 */

export type Attributes = Readonly<Record<string, string | number>>;

/** Fonts that the three systems have; a picture in a hover cannot load its own. */
export const fontStack = "-apple-system, 'Segoe UI', 'Noto Sans', 'DejaVu Sans', Ubuntu, sans-serif";

export function element(name: string, attributes: Attributes, content = ''): string {
  const written = Object.entries(attributes)
    .map(([key, value]) => ` ${key}="${escapeXml(typeof value === 'number' ? short(value) : value)}"`)
    .join('');
  return content === '' ? `<${name}${written}/>` : `<${name}${written}>${content}</${name}>`;
}

export function label(x: number, y: number, text: string, attributes: Attributes): string {
  return element('text', { x, y, ...attributes }, escapeXml(text));
}

export function svgDocument(width: number, height: number, title: string, content: string): string {
  return element(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      width,
      height,
      viewBox: `0 0 ${width} ${height}`,
      'font-family': fontStack,
      'font-size': 12,
      role: 'img',
    },
    element('title', {}, escapeXml(title)) + content,
  );
}

function escapeXml(text: string): string {
  return (
    text
      .replace(/&/g, '&amp;')
      .replace(/</g, '&lt;')
      .replace(/>/g, '&gt;')
      .replace(/"/g, '&quot;')
      // Characters that XML forbids would make the whole picture vanish.
      .replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, '\ufffd')
  );
}

/** Tenths of a pixel are enough. */
function short(value: number): string {
  return String(Number(value.toFixed(1)));
}
