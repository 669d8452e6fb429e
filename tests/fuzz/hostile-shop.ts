import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { stringify } from 'yaml';
import { hiddenCharacters } from '../../src/words/hidden-characters.ts';
import { PAYLOADS } from './hostile-values.ts';

/** Payloads that a text may be: on one line, and nothing in it that cannot be seen. */
const ALLOWED = PAYLOADS.filter(
  (text) => hiddenCharacters(text).length === 0 && !/[\r\n]/.test(text) && text.length <= 80,
);

/**
 * A shop that is accepted and whose every free text is meant to do harm: names, notes, rules, lots, sources. One
 * formula for each payload, with it in the name, the summary, the changes, the approval's name and the method. The
 * words of attacks are texts like others; what matters is that pages show them and do nothing else.
 */
export function writeHostileShop(folder: string): {
  readonly formulas: string;
  readonly data: string;
} {
  const folders = { formulas: join(folder, 'formulas'), data: join(folder, 'data') };
  mkdirSync(folders.formulas, { recursive: true });
  mkdirSync(join(folders.data, 'fats'), { recursive: true });
  const write = (name: string, value: unknown) =>
    writeFileSync(join(folders.data, name), stringify(value, { aliasDuplicateObjects: false }));
  const [evil = '', image = '', quotes = ''] = [
    '<script>alert(1)</script>',
    '<img src=x onerror=alert(1)>',
    `"'><svg/onload=alert(1)>`,
  ];
  write('shop.yaml', {
    name: `${evil} Soap`,
    invented: true,
    batches: [
      {
        id: 'pilot',
        label: `${image}`,
        fats: '1 kg',
        losses: 3,
        scale: 'bench',
        kinds: ['bar', 'paste', 'liquid'],
      },
      { id: 'constructor', label: quotes, fats: '2 kg', scale: 'bench', kinds: ['bar'] },
    ],
    scales: [{ id: 'bench', name: evil, step: '1 g', error: '1 g', capacity: '15 kg' }],
    'start-temperature': '22 C',
    'release-moisture': 12,
    'largest-superfat-shift': 0.3,
    emergency: ALLOWED.map((value) => ({ label: value, value })),
    rules: ALLOWED,
    'release-limits': [{ kind: 'any', process: 'any', end: 'expanded', floor: 0 }],
  });
  write('lots.yaml', {
    fats: [
      {
        fat: 'coconut',
        lot: image,
        'saponification-value': 256.8,
        uncertainty: 0.9,
        method: evil,
        status: 'released',
        'retest-by': '2029-09-01',
      },
    ],
    alkalis: [
      {
        alkali: 'sodium-hydroxide',
        lot: quotes,
        form: 'solid',
        assay: 98.5,
        uncertainty: 0.3,
        carbonate: 0.4,
        status: 'released',
        'retest-by': '2029-06-01',
      },
    ],
  });
  write('blends.yaml', {
    constructor: {
      name: evil,
      parts: [
        { fat: 'olive', share: 50 },
        { fat: 'coconut', share: 50 },
      ],
      notes: ALLOWED,
    },
  });
  const olive = readFileSync('data/fats/olive.yaml', 'utf8')
    .replace('name: Olive oil', `name: '<b onclick=alert(1)>Olive</b> & "oil"'`)
    .replace('inci: Olea Europaea Fruit Oil', `inci: '</title><script src=//evil.invalid>'`)
    .replace(/^notes:[\s\S]*?(?=^\S|$(?![\s\S]))/m, '');
  writeFileSync(
    join(folders.data, 'fats/olive.yaml'),
    `${olive.trimEnd()}\nnotes:\n${ALLOWED.map((text) => `  - ${JSON.stringify(text)}\n`).join('')}`,
  );
  ALLOWED.forEach((payload, i) => {
    const code = `HS-${i + 1}`;
    writeFileSync(join(folders.formulas, `${code}.md`), formula(code, payload));
  });
  return folders;
}

function formula(code: string, payload: string): string {
  const front = {
    code,
    name: payload,
    kind: 'bar',
    process: 'cold',
    revision: 1,
    summary: payload,
    fats: [
      { fat: 'olive', share: 60 },
      { blend: 'constructor', share: 40 },
    ],
    alkali: { sodium: 100 },
    superfat: 8,
    water: { 'lye-concentration': 32 },
    tags: ['constructor', 'hostile'],
    changes: [{ revision: 1, on: '2026-11-01', note: payload }],
  };
  // what is no Markdown of its own stands as code and as escaped text
  const code1 = payload.includes('`') ? '' : `Shown as code: \`${payload}\`.`;
  const escaped = payload.replace(/[!-/:-@[-`{-~]/g, (mark) => `\\${mark}`);
  return `---\n${stringify(front)}---\n
## Method

1. Stir :alkali[sodium] into :water, ${escaped}. ${code1}
2. See [another](formula:HS-1), <https://example.org/> and [mail](mailto:x@example.org).

## ${escaped}

| ${escaped.replaceAll('|', '')} | b |
| - | -: |
| ${escaped.replaceAll('|', '')} | 2 |
`;
}
