/** The element of the page with this id; the page is ours, so a missing one is a fault of the program. */
export function byId(id: string): HTMLElement {
  const found = document.getElementById(id);
  if (!found) throw new Error(`The page has no element "${id}"`);
  return found;
}
