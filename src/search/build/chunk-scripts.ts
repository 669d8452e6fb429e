/** A classic script that carries files of the index by name, as base64: it works from a disk too, where nothing can be fetched. */
export function chunkScript(chunks: Readonly<Record<string, string>>): string {
  const lines = Object.entries(chunks).map(
    ([name, value]) => `handbookIndex[${JSON.stringify(name)}]=${JSON.stringify(value)};`,
  );
  return `self.handbookIndex??={};\n${lines.join('\n')}\n`;
}

/** Reads back what a chunk script carries. Throws where it is not one. */
export function chunksIn(script: string): Readonly<Record<string, string>> {
  const [head, ...lines] = script.trimEnd().split('\n');
  if (head !== 'self.handbookIndex??={};') throw new Error('not a chunk script');
  return Object.fromEntries(
    lines.map((line) => {
      const [, name = '', value = ''] = /^handbookIndex\[(".*?")\]=(".*");$/.exec(line) ?? [];
      return [JSON.parse(name), JSON.parse(value)];
    }),
  );
}
