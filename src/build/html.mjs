// @ts-check
/** Text as it stands in HTML. @param {string} text */
export function escape(text) {
  return text.replace(/&/g, "&amp;").replace(/</g, "&lt;").replace(/>/g, "&gt;").replace(/"/g, "&quot;");
}
