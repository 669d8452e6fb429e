import postcss, { type AtRule, type Declaration, type Node } from 'postcss';
import { isKnown } from '../support/browser-support.ts';

/** Where the compatibility data keep functions, beside those that stand alone. */
const FUNCTIONS = [[], ['color'], ['gradient'], ['transform-function'], ['basic-shape'], ['image']];

/** What a style sheet uses, as ways into the compatibility data. What the data do not know is left as it is written. */
export function featuresOfStyles(css: string): readonly (readonly string[])[] {
  const used: (readonly string[])[] = [];
  const root = postcss.parse(css);
  root.walkAtRules((rule) => {
    used.push(...ofAtRule(rule));
  });
  root.walkDecls((declaration) => {
    used.push(...ofDeclaration(declaration));
  });
  root.walkRules(({ selector }) => {
    if (selector.includes('&')) used.push(['css', 'selectors', 'nesting']);
    for (const [, name = ''] of selector.matchAll(/::?([a-z-]+)/g)) {
      used.push(['css', 'selectors', name]);
    }
  });
  return used;
}

function ofAtRule({ name, params }: AtRule): readonly (readonly string[])[] {
  const at = ['css', 'at-rules'];
  if (isKnown([...at, 'page', `at_${name}`])) return [[...at, 'page', `at_${name}`]];
  if (name !== 'media') return [[...at, name]];
  const features = [...params.matchAll(/\((?:min-|max-)?([a-z-]+)/g)].map(([, feature = '']) => [
    ...at,
    'media',
    feature,
  ]);
  const ranged = /[<>]/.test(params) ? [[...at, 'media', 'range_syntax']] : [];
  return [[...at, 'media'], ...features, ...ranged];
}

function ofDeclaration(declaration: Declaration): readonly (readonly string[])[] {
  const { prop, value } = declaration;
  const within = atRuleOf(declaration);
  const home =
    within && isKnown(['css', 'at-rules', within, prop])
      ? ['css', 'at-rules', within, prop]
      : ['css', 'properties', prop];
  const used: (readonly string[])[] = prop.startsWith('--') ? [] : [home];
  const bare = value.replace(/"[^"]*"|url\([^)]*\)/g, '');
  for (const [, name = ''] of bare.matchAll(/([a-z-]+)\(/g)) {
    // of a font's address, not of a value
    if (prop === 'src') continue;
    const places = FUNCTIONS.map((kind) => ['css', 'types', ...kind, name]);
    used.push([...places, [...home, name]].find(isKnown) ?? ['css', 'types', name]);
  }
  for (const [, unit = ''] of bare.matchAll(/\d(c?[a-z]+)\b/g)) {
    if (isKnown(['css', 'types', 'length', unit])) used.push(['css', 'types', 'length', unit]);
  }
  for (const [word] of bare.matchAll(/[a-z][a-z-]*/g)) {
    if (isKnown([...home, word])) used.push([...home, word]);
  }
  return used;
}

function atRuleOf({ parent }: Node): string | null {
  return parent?.type === 'atrule' ? (parent as AtRule).name : null;
}
