import type { APIRoute } from 'astro';
import worker from '../../browser/kept-copy-worker.ts?worker&url';

/** A worker answers for the folder that its script lies in, so this one lies at the root and takes in the other. */
export const GET: APIRoute = () =>
  new Response(`importScripts(${JSON.stringify(worker.replace(/^\//, ''))});\n`, {
    headers: { 'Content-Type': 'text/javascript; charset=utf-8' },
  });
