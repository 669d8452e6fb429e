type Child = Node | string | null;

/** A new element with its attributes and children. Text is text: nothing is read as markup. */
export function element<Tag extends keyof HTMLElementTagNameMap>(
  tag: Tag,
  attributes: Readonly<Record<string, string | null>> = {},
  ...children: readonly Child[]
): HTMLElementTagNameMap[Tag] {
  const made = document.createElement(tag);
  setAll(made, attributes);
  made.append(...children.filter((child) => child !== null));
  return made;
}

/** The same for a drawing. */
export function drawing<Tag extends keyof SVGElementTagNameMap>(
  tag: Tag,
  attributes: Readonly<Record<string, string | null>> = {},
  ...children: readonly Node[]
): SVGElementTagNameMap[Tag] {
  const made = document.createElementNS('http://www.w3.org/2000/svg', tag);
  setAll(made, attributes);
  made.append(...children);
  return made;
}

/** The one element that the page was made with. Throws where it is not there. */
export function part(id: string): HTMLElement {
  const found = document.getElementById(id);
  if (!found) throw new Error(`the page has no part "${id}"`);
  return found;
}

/** All inputs below an element that carry a data attribute. */
export const inputs = (within: ParentNode, attribute: string): readonly HTMLInputElement[] => [
  ...within.querySelectorAll<HTMLInputElement>(`input[data-${attribute}]`),
];

function setAll(made: Element, attributes: Readonly<Record<string, string | null>>): void {
  for (const [name, value] of Object.entries(attributes)) {
    if (value !== null) made.setAttribute(name, value);
  }
}
