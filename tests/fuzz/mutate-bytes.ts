import type { Chance } from '../support/chance.ts';

const latin = (text: string) => Buffer.from(text, 'latin1');

/** Bytes that mean something to an editor, a decoder, YAML or Markdown. */
const PIECES: readonly Buffer[] = [
  latin('\0'),
  latin('\xEF\xBB\xBF'),
  latin('\xFF\xFE'),
  latin('\xC3'),
  latin('\xED\xA0\x80'),
  latin('\xF5\x80\x80\x80'),
  latin('\xC0\xAF'),
  latin('\x80'),
  latin('\r'),
  latin('\r\n'),
  latin('\n---\n'),
  latin('\n...\n'),
  latin('\t'),
  latin('&a [*a, *a]'),
  latin('<<: *a'),
  latin('!!js/function x'),
  latin('? [a]\n: b\n'),
  latin('"\\u202E"'),
  latin('"\\0\\e[2J"'),
  latin('# '),
  latin('{'),
  latin('['),
  latin('> '.repeat(70)),
  latin('[['.repeat(3000)),
  latin(`${'*a '.repeat(500)}\n`),
  latin(':::x\n'.repeat(25)),
  latin('<div onclick=x>'),
  latin('\n| a |\n| - |\n'),
  latin('[^1]\n\n[^1]: note\n'),
  latin('\n<https://evil.invalid>\n'),
  latin('\n[a]: javascript:x\n\n[a]\n'),
  latin('\n[formula](formula:QY-999)\n'),
  latin('&#x202E;'),
  latin('&#0;'),
  latin(':weight[olive]{a=b}'),
  latin(':weight[__proto__]'),
  latin(':water[x]'),
  latin('::lye\n'),
];

/** A file damaged as by a bad disk, a careless editor or a hostile hand, in one to three places. */
export function mutateBytes(from: Buffer, random: Chance): Buffer {
  let bytes = Buffer.from(from);
  for (let left = 1 + random.below(3); left > 0; left--) {
    const at = random.below(bytes.length + 1);
    const length = random.below(random.pick([2, 40, 400]));
    const ways: readonly (() => Buffer)[] = [
      () => flipped(bytes, at, random.below(8)),
      () => bytes.subarray(0, at),
      () => Buffer.concat([bytes.subarray(0, at), bytes.subarray(at + length)]),
      () => Buffer.concat([bytes.subarray(0, at), random.pick(PIECES), bytes.subarray(at)]),
      () =>
        Buffer.concat([bytes.subarray(0, at), bytes.subarray(at, at + length), bytes.subarray(at)]),
      () => latin(bytes.toString('latin1').replaceAll('\n', '\r\n')),
      () => Buffer.concat([latin('\xEF\xBB\xBF'), bytes]),
      () => lineTwice(bytes, random),
    ];
    bytes = Buffer.from(random.pick(ways)());
  }
  return bytes;
}

function flipped(from: Buffer, at: number, bit: number): Buffer {
  const bytes = Buffer.from(from);
  const byte = bytes[at];
  if (byte !== undefined) bytes[at] = byte ^ (1 << bit);
  return bytes;
}

/** A line written twice: doubled keys, entries, steps. */
function lineTwice(bytes: Buffer, random: Chance): Buffer {
  const lines = bytes.toString('latin1').split('\n');
  const at = random.below(lines.length);
  lines.splice(random.below(lines.length), 0, lines[at] ?? '');
  return latin(lines.join('\n'));
}
