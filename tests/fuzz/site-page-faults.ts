const TAG = /<([a-zA-Z][a-zA-Z0-9-]*)((?:\s+[^\s=>"']+(?:="[^"]*")?)*)\s*\/?>/g;
const ATTRIBUTE = /([^\s=>"']+)(?:="([^"]*)")?/g;

/** Addresses that the hostile shop's own texts link to, as it may. */
const LINKS = /^(https:\/\/(example\.org|evil\.invalid)(\/[^\s"]*)?|mailto:x@example\.org)$/;
const OWN = /^(?!\/\/)[A-Za-z0-9._/-]*(#[^"<>]*)?$/;

/** What a whole page may not have: scripts that are not ours, styles inside, handlers, addresses of others. */
export function sitePageFaults(html: string): readonly string[] {
  const faults: string[] = [];
  for (const { 0: whole, 1: name = '', 2: attributes = '', index } of html.matchAll(TAG)) {
    const tag = name.toLowerCase();
    const given = new Map(
      [...attributes.matchAll(ATTRIBUTE)].map(([, key = '', value]) => [
        key.toLowerCase(),
        value ?? '',
      ]),
    );
    if (['style', 'iframe', 'object', 'embed', 'base', 'foreignobject'].includes(tag)) {
      faults.push(`<${tag}>`);
    }
    if (tag === 'script' && !OWN.test(given.get('src') ?? '//'))
      faults.push('a script without a file of ours');
    if (tag === 'script' && !html.startsWith('</script>', index + whole.length)) {
      faults.push('a script inside the page');
    }
    for (const [key, value] of given) {
      if (key.startsWith('on') || key === 'srcdoc') faults.push(`<${tag} ${key}>`);
      if (key === 'style' && /url|expression|@import/i.test(value)) faults.push(`style="${value}"`);
      if (['href', 'src', 'action', 'data', 'xlink:href', 'poster'].includes(key)) {
        const isLink = tag === 'a' && LINKS.test(value);
        if (!isLink && !OWN.test(value)) faults.push(`<${tag} ${key}="${value}">`);
      }
      if (key === 'srcset' && /(^|\s)(https?:)?\/\//.test(value)) faults.push(`srcset="${value}"`);
    }
    if (tag === 'meta' && given.get('http-equiv')?.toLowerCase() === 'refresh')
      faults.push('a refresh');
  }
  return faults;
}
