import type { z } from 'zod';
import { didYouMean } from './nearest.ts';
import type { DataReport } from './report.ts';
import type { sourcesSchema } from './schema/sources.ts';
import type { Source } from './values.ts';
import type { YamlPath } from './yaml.ts';

export function sourcesFrom(raw: z.infer<typeof sourcesSchema>): Map<string, Source> {
  return new Map(
    Object.entries(raw).map(([id, source]) => [
      id,
      {
        id,
        title: source.title,
        author: source.author ?? null,
        edition: source.edition ?? null,
        year: source.year ?? null,
        kind: source.kind,
        address: source.address ?? null,
        readOn: source['read-on'] ?? null,
      },
    ]),
  );
}

/** Every `source` named anywhere in a file must have its record. */
export function reportUnknownSources(
  value: unknown,
  sources: ReadonlyMap<string, Source>,
  report: DataReport,
  path: YamlPath = [],
): void {
  if (typeof value !== 'object' || value === null) return;
  for (const [key, inner] of Object.entries(value)) {
    const at = [...path, Array.isArray(value) ? Number(key) : key];
    if (key === 'source' && typeof inner === 'string' && !sources.has(inner)) {
      report.in(at, 'data/unknown-source', {
        found: `source "${inner}"`,
        expected: 'an id from data/sources.yaml',
        advice: didYouMean(
          inner,
          sources.keys(),
          'add a record for it there, or in own-sources.yaml',
        ),
      });
    }
    reportUnknownSources(inner, sources, report, at);
  }
}
