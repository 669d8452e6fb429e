interface LockedPackage {
  readonly name?: string;
  readonly version: string;
  readonly integrity: string;
  readonly license?: string;
  readonly dev?: boolean;
  readonly optional?: boolean;
  readonly devOptional?: boolean;
}

type License = { readonly license: { readonly id: string } } | { readonly expression: string };

interface Component {
  readonly type: 'library';
  readonly 'bom-ref': string;
  readonly name: string;
  readonly version: string;
  readonly scope: 'required' | 'optional';
  readonly purl: string;
  readonly hashes: readonly { readonly alg: string; readonly content: string }[];
  readonly licenses: readonly License[];
}

/**
 * The software that a handbook is built with, from the text of the npm lockfile (version 3), as CycloneDX 1.5
 * (ECMA-424). Without serial number and time, which the standard leaves open, so that two builds agree. What only
 * tests and linting need is not in it; `optional` are packages for some machines only.
 */
export function billOfMaterials(lockfile: string): string {
  const { name, version, packages } = JSON.parse(lockfile) as {
    readonly name: string;
    readonly version: string;
    readonly packages: Readonly<Record<string, LockedPackage>>;
  };
  const components = new Map<string, Component>();
  for (const [path, locked] of Object.entries(packages)) {
    if (path === '' || locked.dev) continue;
    const component = componentOf(locked.name ?? nameIn(path), locked);
    const reference = component['bom-ref'];
    // one version may lie in two folders; needed by one of them, it is needed
    if (components.get(reference)?.scope !== 'required') components.set(reference, component);
  }
  const reference = `${name}@${version}`;
  const bill = {
    $schema: 'http://cyclonedx.org/schema/bom-1.5.schema.json',
    bomFormat: 'CycloneDX',
    specVersion: '1.5',
    version: 1,
    metadata: { component: { type: 'application', 'bom-ref': reference, name, version } },
    components: [...components.values()].toSorted((a, b) => (a['bom-ref'] < b['bom-ref'] ? -1 : 1)),
  };
  return `${JSON.stringify(bill, null, 2)}\n`;
}

/** `node_modules/a/node_modules/@b/c` -> `@b/c` */
const nameIn = (path: string) => path.slice(path.lastIndexOf('node_modules/') + 13);

function componentOf(name: string, locked: LockedPackage): Component {
  const { version, integrity, license, optional, devOptional } = locked;
  const [algorithm = '', digest = ''] = integrity.split('-', 2);
  return {
    type: 'library',
    'bom-ref': `${name}@${version}`,
    name,
    version,
    scope: optional || devOptional ? 'optional' : 'required',
    purl: `pkg:npm/${name.replace('@', '%40')}@${version}`,
    hashes: [
      {
        alg: algorithm.replace('sha', 'SHA-').toUpperCase(),
        content: Buffer.from(digest, 'base64').toString('hex'),
      },
    ],
    licenses: license ? [licenseOf(license)] : [],
  };
}

/** One SPDX id, or an expression of several. */
const licenseOf = (text: string): License =>
  text.includes(' ') ? { expression: text } : { license: { id: text } };
