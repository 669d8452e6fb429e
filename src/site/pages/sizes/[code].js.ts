import type { APIRoute } from 'astro';
import type { AnySizeData } from '../../../browser/any-size-data.ts';
import { anySizeOffers } from '../../any-size/offers.ts';
import { siteInput } from '../../input.ts';

export const getStaticPaths = () =>
  anySizeOffers(siteInput().edition).map(({ data }) => ({
    params: { code: data.code },
    props: { data },
  }));

/** The numbers of one formula as a classic script: it works from a disk too, where nothing can be fetched. */
export const GET: APIRoute<{ data: AnySizeData }> = ({ props: { data } }) =>
  new Response(`self.handbookAnySize=${JSON.stringify(data)};\n`, {
    headers: { 'Content-Type': 'text/javascript; charset=utf-8' },
  });
