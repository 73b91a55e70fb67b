/** Copying text, where the host's web view allows it. */

/** Puts text on the clipboard; false if neither the clipboard interface nor the older copy command is allowed. */
export async function copyText(text: string): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(text);
    return true;
  } catch {
    return copyBySelection(text);
  }
}

/** The older way: a field off the screen is selected and copied. */
function copyBySelection(text: string): boolean {
  const focused = document.activeElement;
  const field = document.createElement("textarea");
  field.value = text;
  field.className = "still-hidden";
  document.body.append(field);
  field.select();
  const copied = document.execCommand("copy");
  field.remove();
  if (focused instanceof HTMLElement) focused.focus();
  return copied;
}
