const published =
  "default-src 'none'; style-src 'self'; font-src 'self'; img-src 'self'; script-src 'self'; worker-src 'self'; manifest-src 'self'; form-action 'none'; base-uri 'none'";

// the preview's reload needs a socket and style elements; nothing published does
const preview =
  "default-src 'none'; style-src 'self' 'unsafe-inline'; font-src 'self'; img-src 'self'; script-src 'self' 'unsafe-inline'; connect-src 'self' ws:; form-action 'none'; base-uri 'none'";

/** Policy of every page: nothing from another host, nothing inline. */
export const contentSecurityPolicy = import.meta.env.DEV ? preview : published;
