/** `n_OH` as HTML with its index set low. Symbols come from the words of this project, and are escaped. */
export function withSubscripts(symbol: string): string {
  const safe = symbol.replaceAll('&', '&amp;').replaceAll('<', '&lt;');
  return safe.replace(/_(\w+)/g, '<sub>$1</sub>');
}
