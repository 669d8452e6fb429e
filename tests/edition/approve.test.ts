import { spawnSync } from 'node:child_process';
import { chmodSync, existsSync, readdirSync, readFileSync, symlinkSync } from 'node:fs';
import { dirname, join } from 'node:path';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { completeApproval, prepareApproval } from '../../src/edition/approve-fs.ts';
import { parseLedger } from '../../src/edition/ledger.ts';
import { writeApproval } from '../../src/edition/write-approval.ts';
import { splitFrontmatter } from '../../src/formulary/frontmatter.ts';
import { parseYaml } from '../../src/reference/yaml.ts';
import { approvalLines } from '../../src/words/en/approval-lines.ts';
import { AS_OF, approvedShop, emptyFolder, FORMULA, shopWith } from './shop.ts';

const APPROVAL = {
  by: 'Quality lead',
  on: '2026-12-01',
  reviewBy: '2027-12-01',
  fingerprint: '8g9p-z8tn-pdkr-n',
};
const LINE =
  'approval: { by: Quality lead, on: 2026-12-01, review-by: 2027-12-01, fingerprint: 8g9p-z8tn-pdkr-n }';

describe('writing an approval into a text', () => {
  test('adds one line at the end of the frontmatter and touches nothing else', () => {
    const next = writeApproval(FORMULA, APPROVAL) ?? '';
    expect(next).toBe(FORMULA.replace('tags: [plain]\n', `tags: [plain]\n${LINE}\n`));
  });

  test('keeps the line ends and the byte order mark', () => {
    const text = `\uFEFF${FORMULA}`.replaceAll('\n', '\r\n');
    const next = writeApproval(text, APPROVAL) ?? '';
    expect(next).toBe(text.replace('[plain]\r\n', `[plain]\r\n${LINE}\r\n`));
  });

  test('changes only the values of an approval that is there, with its comments and its order', () => {
    const old = `approval: # on paper too, folder 3
  fingerprint: 0000-0000-0000-0   # by the command
  by: "Somebody else"
  review-by: 2026-01-01 # yearly
  on: 2025-01-01
`;
    const next = writeApproval(FORMULA.replace('tags:', `${old}tags:`), APPROVAL) ?? '';
    const expected = `approval: # on paper too, folder 3
  fingerprint: 8g9p-z8tn-pdkr-n   # by the command
  by: Quality lead
  review-by: 2027-12-01 # yearly
  on: 2026-12-01
`;
    expect(next).toBe(FORMULA.replace('tags:', `${expected}tags:`));
  });

  test('has no place in frontmatter of another form', () => {
    expect(writeApproval('no frontmatter', APPROVAL)).toBeNull();
    expect(writeApproval('---\n{ code: TT-001 }\n---\n', APPROVAL)).toBeNull();
    expect(writeApproval('---\ncode: x\napproval: { by: x }\n---\n', APPROVAL)).toBeNull();
  });

  test('any name on one line is read back as it was given', () => {
    const name = fc
      .string({ unit: 'grapheme', minLength: 1, maxLength: 40 })
      .map((text) => text.trim())
      .filter((text) => text !== '' && !/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}\p{Cs}]/u.test(text));
    const odd = fc.constantFrom(
      'true',
      'no',
      '12',
      '1e5',
      "O'Neil",
      'a: b',
      '# x',
      '- x',
      '}',
      '"',
    );
    fc.assert(
      fc.property(fc.oneof(name, odd), (by) => {
        const parts = splitFrontmatter(writeApproval(FORMULA, { ...APPROVAL, by }) ?? '');
        const { value } = parseYaml(parts.ok ? parts.yaml : '');
        expect(value).toMatchObject({ approval: { by, on: '2026-12-01' }, tags: ['plain'] });
      }),
      { numRuns: 500 },
    );
  });
});

describe('approving', () => {
  test('writes the file and one line of the ledger', () => {
    const shop = shopWith();
    expect(shop.approve()).toEqual([]);
    const { entries, problems } = parseLedger(readFileSync(shop.ledger, 'utf8'), 'ledger');
    expect(problems).toEqual([]);
    expect(entries).toMatchObject([
      { kind: 'approved', code: 'TT-001', revision: 1, by: 'Quality lead', on: AS_OF },
    ]);
    expect(shop.textOf('TT-001.md')).toContain(
      `fingerprint: ${entries[0]?.kind === 'approved' && entries[0].fingerprint} }`,
    );
    expect(readdirSync(shop.folders.formulas)).toEqual(['TT-001.md']);
  });

  test('shows first what changed, in numbers', () => {
    const shop = approvedShop();
    shop.edit('TT-001.md', 'share: 60', 'share: 50');
    shop.edit('TT-001.md', 'share: 40', 'share: 50');
    const request = { code: 'TT-001', by: 'x', on: AS_OF, until: '2027-12-01' };
    const prepared = prepareApproval(shop.folders, request);
    if (!prepared.ok) throw new Error('refused');
    expect(prepared.pending).toMatchObject({ stateBefore: 'changed-since-approval' });
    const lines = approvalLines(prepared.pending).join('\n');
    expect(lines).toMatch(/olive +600\.00 +500\.00 +\u2212100\.00/);
    expect(lines).toMatch(/coconut +400\.00 +500\.00 +\+100\.00/);
    expect(lines).toMatch(/sodium-hydroxide +\d+\.\d\d +\d+\.\d\d +\+\d+\.\d\d/);
  });

  test('does not need the other formulas to be sound', () => {
    const shop = shopWith({ 'TT-001.md': FORMULA, 'TT-002.md': '---\ncode: TT-002\n---\n' });
    expect(shop.approve()).toEqual([]);
    expect(shop.approve('TT-002')).toMatchObject(
      expect.arrayContaining([expect.objectContaining({ rule: 'edition/formula-with-errors' })]),
    );
  });

  test.each([
    ['an empty name', { by: '   ' }, 'edition/approver-name'],
    ['a name on two lines', { by: 'a\nb' }, 'edition/approver-name'],
    ['a name with a hidden letter', { by: 'a\u200bb' }, 'edition/approver-name'],
    ['a day that does not exist', { until: '2027-02-30' }, 'edition/approval-date'],
    ['another day that does not', { on: '2026-2-3' }, 'edition/approval-date'],
    ['a review before the approval', { until: '2026-11-30' }, 'edition/approval-date'],
    ['a review on the same day', { until: AS_OF }, 'edition/approval-date'],
    ['an unknown code', { code: 'TT-009' }, 'edition/unknown-code'],
    ['no code', { code: '' }, 'edition/unknown-code'],
  ])(
    'refuses %s and changes nothing',
    (_, { code = 'TT-001', ...wish }: Record<string, string>, rule) => {
      const shop = shopWith();
      expect(shop.approve(code, wish)).toMatchObject([{ rule, severity: 'error' }]);
      expect(shop.textOf('TT-001.md')).toBe(FORMULA);
      expect(existsSync(shop.ledger)).toBe(false);
    },
  );

  test('refuses two formulas with one code', () => {
    const shop = shopWith({ 'a.md': FORMULA, 'b.md': FORMULA.replace('TT-001', 'TT-01') });
    expect(shop.approve()).toMatchObject([{ rule: 'edition/code-twice' }]);
    expect(shop.textOf('a.md')).toBe(FORMULA);
  });

  test('refuses a formula with an error, with the error', () => {
    const shop = shopWith({ 'TT-001.md': FORMULA.replace('share: 60', 'share: 61') });
    expect(shop.approve().map(({ rule }) => rule)).toEqual([
      'formula/shares-sum',
      'edition/formula-with-errors',
    ]);
  });

  test('refuses frontmatter in a form that it cannot write into', () => {
    const front = '{ code: TT-001, name: N, kind: bar, process: cold, revision: 1, superfat: 8,';
    const rest = 'fats: [{ fat: olive, share: 100 }], alkali: { sodium: 100 },';
    const text = FORMULA.replace(
      /---\n[\s\S]*?---/,
      `---\n${front}\n${rest} water: { lye-concentration: 32 } }\n---`,
    ).replace(':weight[coconut] with ', '');
    const shop = shopWith({ 'TT-001.md': text });
    expect(shop.approve()).toMatchObject([{ rule: 'edition/approval-place' }]);
    expect(shop.textOf('TT-001.md')).toBe(text);
  });

  test('refuses a file that changed after it was shown, and keeps the change', () => {
    const shop = shopWith();
    const request = { code: 'TT-001', by: 'x', on: AS_OF, until: '2027-12-01' };
    const prepared = prepareApproval(shop.folders, request);
    if (!prepared.ok) throw new Error('refused');
    shop.edit('TT-001.md', 'superfat: 8', 'superfat: 9');
    const changed = shop.textOf('TT-001.md');
    expect(completeApproval(prepared.pending)).toMatchObject([{ rule: 'edition/file-changed' }]);
    expect(shop.textOf('TT-001.md')).toBe(changed);
    expect(existsSync(shop.ledger)).toBe(false);
    expect(readdirSync(shop.folders.formulas)).toEqual(['TT-001.md']);
  });

  test('follows a link to the file and leaves it a link', () => {
    const shop = shopWith({});
    const elsewhere = shopWith();
    symlinkSync(join(elsewhere.folders.formulas, 'TT-001.md'), join(shop.folders.formulas, 'l.md'));
    expect(shop.approve()).toEqual([]);
    expect(elsewhere.textOf('TT-001.md')).toContain('approval:');
  });

  test('a broken ledger is an error, and stays as it is', () => {
    const shop = approvedShop();
    const before = readFileSync(shop.ledger, 'utf8');
    shop.write('../data/ledger.jsonl', `${before}{"kind":"appro`);
    expect(shop.approve()).toMatchObject([{ rule: 'edition/ledger-line', line: 2 }]);
    expect(readFileSync(shop.ledger, 'utf8')).toBe(`${before}{"kind":"appro`);
  });
});

describe('where nothing can be written', () => {
  const command = ['src/commands/run.js', 'approve', 'TT-001', '--by', 'x', '--on', AS_OF];

  /** Runs the command in a shell that limits it first. */
  function approveAfter(limit: string, shop: ReturnType<typeof shopWith>) {
    const { formulas, data } = shop.folders;
    const words = [process.execPath, ...command, '--until', '2027-12-01'];
    const all = [...words, '--formulas', formulas, '--data', data].map((word) => `'${word}'`);
    return spawnSync('sh', ['-c', `${limit}; exec ${all.join(' ')}`], { encoding: 'utf8' });
  }

  test('on a full disk the file stays as it was', () => {
    // the limit stands in for a full disk: the file system refuses the bytes in the same place
    const long = `${FORMULA}\n${'Words that fill the file. '.repeat(400)}\n`;
    const shop = shopWith({ 'TT-001.md': long });
    const { status, stderr } = approveAfter('trap "" XFSZ; ulimit -f 8', shop);
    expect(stderr).toContain('[edition/cannot-write]');
    expect(status).toBe(1);
    expect(shop.textOf('TT-001.md')).toBe(long);
    expect(readdirSync(shop.folders.formulas)).toEqual(['TT-001.md']);
  });

  test('in a read-only folder the file stays as it was', () => {
    const shop = shopWith();
    const request = { code: 'TT-001', by: 'x', on: AS_OF, until: '2027-12-01' };
    const prepared = prepareApproval(shop.folders, request);
    if (!prepared.ok) throw new Error('refused');
    const { formulas } = shop.folders;
    chmodSync(formulas, 0o555);
    const problems = asNobody([formulas, dirname(formulas), dirname(dirname(formulas))], () =>
      completeApproval(prepared.pending),
    );
    chmodSync(formulas, 0o755);
    expect(problems).toMatchObject([{ rule: 'edition/cannot-write' }]);
    expect(shop.textOf('TT-001.md')).toBe(FORMULA);
  });

  test('a ledger that cannot be written is told, with the file approved', () => {
    const shop = shopWith();
    const request = { code: 'TT-001', by: 'x', on: AS_OF, until: '2027-12-01' };
    const prepared = prepareApproval(shop.folders, request);
    if (!prepared.ok) throw new Error('refused');
    const nowhere = join(emptyFolder(), 'gone', 'ledger.jsonl');
    expect(completeApproval({ ...prepared.pending, ledger: nowhere })).toMatchObject([
      { rule: 'edition/cannot-write', file: nowhere },
    ]);
    expect(shop.textOf('TT-001.md')).toContain('approval:');
  });
});

/** To the superuser no folder is read-only: the work is done as a user without rights, who may pass `ways`. */
function asNobody<T>(ways: readonly string[], work: () => T): T {
  if (process.geteuid?.() !== 0) return work();
  for (const way of ways) chmodSync(way, 0o555);
  process.seteuid?.(65534);
  try {
    return work();
  } finally {
    process.seteuid?.(0);
    for (const way of ways) chmodSync(way, 0o755);
  }
}
