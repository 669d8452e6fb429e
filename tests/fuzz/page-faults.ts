/** Elements that the text of a formula may become. */
const TEXT =
  /^(a|b|blockquote|br|code|dd|del|div|dl|dt|em|h[3-6]|hr|img|input|li|ol|p|pre|section|strong|sub|sup|table|tbody|td|th|thead|tr|ul)$/;
const MATH = /^(math|mrow|mi|mn|mo|mtext|msub|msup|msqrt|mfrac|munder|mspace|mtable|mtr|mtd)$/;

/** Which attribute of which element may hold what. */
const ATTRIBUTES: Readonly<Record<string, RegExp>> = {
  'a href': /^(https?:\/\/[^"<>]+|mailto:[^"<>]*|\/formulas\/[A-Z]{2,4}-[0-9]{1,4}[A-Z]?\.html)$/i,
  'b class': /^amount$/,
  'img src': /^\/formulas\/[A-Za-z0-9_][A-Za-z0-9_./-]*\.(png|jpe?g|webp)$/i,
  'img alt': /^[^"<>]*$/,
  'ol start': /^-?\d+$/,
  'li value': /^\d+$/,
  'th align': /^(left|right|center)$/,
  'td align': /^(left|right|center)$/,
  'math xmlns': /^http:\/\/www\.w3\.org\/1998\/Math\/MathML$/,
  'math display': /^block$/,
  'mi mathvariant': /^normal$/,
};

/** What a piece of a page made from a formula's text or numbers may not hold: any element or attribute but these. */
export function pieceFaults(html: string): readonly string[] {
  const faults: string[] = [];
  // a stray "<" or a comment is no tag of ours either
  const rest = html.replace(
    /<(\/?)([a-zA-Z][a-zA-Z0-9]*)((?:\s+[^<>"]+(?:="[^"]*")?)*)\s*\/?>/g,
    (_, __, name, attributes) => {
      if (!TEXT.test(name) && !MATH.test(name)) faults.push(`<${name}>`);
      for (const [, key = '', , value = ''] of String(attributes).matchAll(
        /([^\s="]+)(="([^"]*)")?/g,
      )) {
        if (!ATTRIBUTES[`${name} ${key}`]?.test(value)) faults.push(`<${name} ${key}="${value}">`);
      }
      return '';
    },
  );
  if (rest.includes('<')) faults.push(rest.slice(rest.indexOf('<'), rest.indexOf('<') + 60));
  if (html.includes('\0') || /[\u202A-\u202E\u2066-\u2069]/.test(html)) faults.push('hidden');
  return faults;
}
