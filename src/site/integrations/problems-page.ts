import type { Problem } from '../../words/problem.ts';
import { problemSummary, problemText } from '../../words/problem-text.ts';

const STYLE =
  'body{font:16px/1.5 ui-monospace,monospace;max-width:70rem;margin:2rem auto;padding:0 1rem;color-scheme:light dark}h1{font-size:1.3rem}li{margin:.7rem 0;overflow-wrap:anywhere}';

/** The page that stands in for every other in the preview while a file is broken. It reloads when that ends. */
export function problemsPage(problems: readonly Problem[]): string {
  const summary = escaped(problemSummary(problems));
  const items = problems.map((problem) => `<li>${escaped(problemText(problem))}</li>`).join('');
  return `<!doctype html><html lang="en"><meta charset="utf-8"><title>${summary}</title><style>${STYLE}</style><script type="module" src="/@vite/client"></script><h1>${summary}</h1><ul>${items}</ul></html>`;
}

const escaped = (text: string) =>
  text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
