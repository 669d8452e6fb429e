import { expect, test } from 'vitest';
import { shopSchema } from '../../src/reference/schema/shop.ts';

const accepts = (address: string) => shopSchema.shape['site-address'].safeParse(address).success;

test.each(['https://example.org', 'https://example.org/handbook/', 'http://192.0.2.7:8080/soap'])(
  '%s can stand in a QR code',
  (address) => expect(accepts(address)).toBe(true),
);

test.each([
  'example.org',
  'ftp://example.org/',
  'https://example.org/?page=1',
  'https://example.org/#top',
  'https://exa mple.org/',
  'javascript:alert(1)',
  `https://example.org/${'a'.repeat(300)}`,
])('%s cannot', (address) => expect(accepts(address)).toBe(false));
