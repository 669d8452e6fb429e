import { type ESTree, parseAst } from 'vite';
import { isKnown, lacking, namesBelow } from '../support/browser-support.ts';

/** Made by `keys()`, `values()` and the like: what an array has for long, an iterator has not. */
const MAKES_ITERATOR = new Set(['keys', 'values', 'entries', 'matchAll']);
const BUILTINS = ['javascript', 'builtins'];

/** Names of our own data that some object of a newer interface happens to have too. */
const OWN_NAMES = new Set(
  'chunks drop format limits lines locale phrase properties results unit where'.split(' '),
);

/** Every name of a built-in or of the page's objects with the ways to it in the compatibility data. */
const HOMES = homes();

/** What a script uses, as ways into the compatibility data. A name that an older object has too counts as that one. */
export function featuresOfScript(code: string): readonly (readonly string[])[] {
  const used: (readonly string[])[] = [];
  visit(parseAst(code), (node) => used.push(...ofNode(node)));
  return used;
}

function ofNode(node: ESTree.Node): readonly (readonly string[])[] {
  switch (node.type) {
    case 'Identifier':
      return [
        [...BUILTINS, node.name],
        ['api', node.name],
      ]
        .filter(isKnown)
        .slice(0, 1);
    case 'MemberExpression':
      return ofMember(node);
    case 'Literal':
      return 'regex' in node && node.regex ? ofPattern(node.regex) : [];
    default:
      return [];
  }
}

function ofMember({ object, property, computed }: ESTree.MemberExpression) {
  if (computed || property.type !== 'Identifier') return [];
  const { name } = property;
  if (object.type === 'Identifier') {
    const own = [
      [...BUILTINS, object.name, name],
      ['api', object.name, `${name}_static`],
    ].filter(isKnown);
    if (own.length > 0) return own;
  }
  const helper = [...BUILTINS, 'Iterator', name];
  if (isIterator(object) && isKnown(helper)) return [helper];
  const ways = OWN_NAMES.has(name) ? [] : (HOMES.get(name) ?? []);
  const old = ways.find((way) => lacking(way).length === 0);
  return [old ?? ways[0] ?? []].filter((way) => way.length > 0);
}

/** Whether it is what `map.values()` gives; `Object.values(map)` gives an array. */
function isIterator(made: ESTree.Node): boolean {
  if (made.type !== 'CallExpression' || made.callee.type !== 'MemberExpression') return false;
  const { object, property } = made.callee;
  const ofObject = object.type === 'Identifier' && object.name === 'Object';
  return property.type === 'Identifier' && MAKES_ITERATOR.has(property.name) && !ofObject;
}

function ofPattern({ pattern, flags }: { pattern: string; flags: string }) {
  const syntax = ['javascript', 'regular_expressions'];
  return [
    flags.includes('v') && [...BUILTINS, 'RegExp', 'unicodeSets'],
    flags.includes('d') && [...BUILTINS, 'RegExp', 'hasIndices'],
    /\(\?<[=!]/.test(pattern) && [...syntax, 'lookbehind_assertion'],
    /\\p\{/i.test(pattern) && [...syntax, 'unicode_character_class_escape'],
    /\(\?[ims-]+:/.test(pattern) && [...syntax, 'modifier'],
  ].filter((way) => way !== false);
}

function visit(node: ESTree.Node, see: (node: ESTree.Node) => void): void {
  see(node);
  for (const value of Object.values(node)) {
    for (const each of Array.isArray(value) ? value : [value]) {
      if (each && typeof each === 'object' && typeof each.type === 'string') visit(each, see);
    }
  }
}

function homes(): ReadonlyMap<string, readonly (readonly string[])[]> {
  const found = new Map<string, (readonly string[])[]>();
  for (const kind of [BUILTINS, ['api']]) {
    for (const object of namesBelow(kind)) {
      for (const name of namesBelow([...kind, object])) {
        found.set(name, [...(found.get(name) ?? []), [...kind, object, name]]);
      }
    }
  }
  return found;
}
