/** A tag of a page that this project wrote, and the text before it, as they stand. */
export type Piece =
  | { readonly kind: 'text'; readonly raw: string }
  | {
      readonly kind: 'open';
      readonly raw: string;
      readonly name: string;
      /** For `attributesOf`, as it stands. */
      readonly attributes: string;
      /** Has no content and no end tag. */
      readonly empty: boolean;
    }
  | { readonly kind: 'close'; readonly raw: string; readonly name: string };

export interface Attribute {
  readonly name: string;
  /** Between the quotes as it stands; `null` for a name alone. */
  readonly value: string | null;
}

const TAG =
  /<(?:!--[\s\S]*?-->|(\/?)([a-zA-Z][a-zA-Z0-9-]*)((?:\s+[^\s"'<>/=]+(?:="[^"]*"|='[^']*'|=[^\s"'<>=`]+)?)*)\s*(\/?)>)/y;
const ATTRIBUTE = /\s+([^\s"'<>/=]+)(?:="([^"]*)"|='([^']*)'|=([^\s"'<>=`]+))?/g;
/** Elements without content by the HTML standard, section 13.1.2. */
const VOID = new Set('area base br col embed hr img input link meta source track wbr'.split(' '));
/** What stands in these is no markup. */
const RAW = new Set(['script', 'style']);
/** In these an element may end in its own tag, by the HTML standard, section 13.1.2.1. */
const FOREIGN = new Set(['svg', 'math']);

/**
 * Takes a part of a page apart, in order; what the pieces hold in `raw` is the part again, without its comments.
 * Only for pages that this project wrote: it knows less than a browser forgives, and refuses all of that.
 *
 * @throws Error where a tag is not closed in its turn or is none.
 */
export function* htmlPieces(html: string): Generator<Piece, void> {
  const open: string[] = [];
  let foreign = 0;
  let at = 0;
  while (at < html.length) {
    const next = html.indexOf('<', at);
    const end = next < 0 ? html.length : next;
    if (end > at) yield { kind: 'text', raw: html.slice(at, end) };
    if (next < 0) break;
    TAG.lastIndex = next;
    const found = TAG.exec(html);
    if (!found) throw new Error(`no tag: ${html.slice(next, next + 60)}`);
    const [raw, slash, name, given = '', selfClosing] = found;
    at = next + raw.length;
    if (name === undefined) continue;
    if (foreign === 0 && /[A-Z]/.test(name)) throw new Error(`${raw} is not written small`);
    if (slash) {
      if (open.pop() !== name) throw new Error(`</${name}> closes nothing`);
      if (FOREIGN.has(name)) foreign--;
      yield { kind: 'close', raw, name };
      continue;
    }
    if (selfClosing && foreign === 0 && !VOID.has(name))
      throw new Error(`<${name}/> is not closed`);
    const empty = VOID.has(name) || (selfClosing === '/' && foreign > 0);
    yield { kind: 'open', raw, name, attributes: given, empty };
    if (empty) continue;
    open.push(name);
    if (FOREIGN.has(name)) foreign++;
    if (RAW.has(name)) {
      const close = html.indexOf(`</${name}`, at);
      if (close < 0) throw new Error(`<${name}> is not closed`);
      if (close > at) yield { kind: 'text', raw: html.slice(at, close) };
      at = close;
    }
  }
  if (open.length > 0) throw new Error(`<${open.at(-1)}> is not closed`);
}

/** The attributes of a tag, in their order. */
export function attributesOf(given: string): readonly Attribute[] {
  return [...given.matchAll(ATTRIBUTE)].map(([, name = '', double, single, bare]) => ({
    name,
    value: double ?? single ?? bare ?? null,
  }));
}
