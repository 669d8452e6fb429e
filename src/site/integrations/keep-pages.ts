import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import type { AstroIntegration, AstroPrerenderer } from 'astro';
import { pruneKept } from '../../handbook/kept-files-fs.ts';
import { withoutFormulary } from '../input.ts';
import { type KeptPages, keptPages } from '../kept-pages-fs.ts';
import { programHash } from '../program-hash-fs.ts';

/** Each day that the edition is of has its own pages, so they are not kept for long. [d] */
const LONGEST_UNUSED = 2;

/**
 * Takes the pages of `keptPath()` from an earlier build where all that they can read is the same. Astro has the like,
 * but keeps pages by their address: after a build that broke, or two at once, one could come back with the weights of
 * another state of its formula.
 */
export function keepPages(): AstroIntegration {
  let project = '';
  let folder = '';
  return {
    name: 'keep-pages',
    hooks: {
      'astro:config:done': ({ config }) => {
        project = fileURLToPath(config.root);
        folder = join(project, '.cache', 'pages');
      },
      'astro:build:start': ({ setPrerenderer }) => {
        const before = programHash(project);
        setPrerenderer((usual) =>
          keeping(usual, () => {
            // somebody who writes the program while it is bundled gets no page of it kept
            const program = programHash(project);
            return program === before ? keptPages(folder, program) : null;
          }),
        );
      },
      'astro:build:done': () => pruneKept(folder, LONGEST_UNUSED, Date.now()),
    },
  };
}

/** Makes the pages as `usual` does, but for those that are kept. `open` is called when the program is bundled. */
function keeping(usual: AstroPrerenderer, open: () => KeptPages | null): AstroPrerenderer {
  let kept: KeptPages | null = null;
  let keys: ReadonlyMap<string, string> = new Map();
  return {
    ...usual,
    setup: async () => {
      await usual.setup?.();
      kept = open();
    },
    getStaticPaths: async () => {
      const paths = await usual.getStaticPaths();
      keys = new Map(
        paths.flatMap(({ pathname, route, cacheKey }) =>
          cacheKey === undefined ? [] : [[nameOf(route.component, pathname), cacheKey] as const],
        ),
      );
      return paths;
    },
    render: async (request, options) => {
      const { pathname } = new URL(request.url);
      const page = nameOf(options.routeData.component, decodeURI(pathname).replace(/\.html$/, ''));
      const key = keys.get(page);
      if (key === undefined) return usual.render(request, options);
      const name = `${page}\n${key}`;
      const found = kept?.find(name);
      if (found) return htmlResponse(found);
      const made = await withoutFormulary(async () => {
        const result = await usual.render(request, options);
        const response = result instanceof Response ? result : result.response;
        if (response.status !== 200) throw new Error(`${page} was answered ${response.status}`);
        // it is made while it is read
        return Buffer.from(await response.arrayBuffer());
      });
      kept?.keep(name, made);
      return htmlResponse(made);
    },
  };
}

const nameOf = (component: string, pathname: string) => `${component} ${pathname}`;

const htmlResponse = (page: Buffer) =>
  new Response(new Uint8Array(page), { headers: { 'Content-Type': 'text/html' } });
