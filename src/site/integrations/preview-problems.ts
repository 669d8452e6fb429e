import type { AstroIntegration } from 'astro';
import type { Problem } from '../../words/problem.ts';
import { problemsPage } from './problems-page.ts';

/** In the preview, answers every page with the problems that stand against it, until there are none. */
export function previewProblems(current: () => readonly Problem[]): AstroIntegration {
  return {
    name: 'preview-problems',
    hooks: {
      'astro:server:setup': ({ server }) => {
        server.middlewares.use((request, response, next) => {
          const problems = current();
          const wantsPage = request.headers.accept?.includes('text/html');
          if (problems.length === 0 || !wantsPage) {
            next();
            return;
          }
          response.writeHead(500, { 'Content-Type': 'text/html; charset=utf-8' });
          response.end(problemsPage(problems));
        });
      },
    },
  };
}
