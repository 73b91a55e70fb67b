/** Light or dark as the system asks for it, for hosts that do not say more. */
import type { Host } from "./host";

export function systemTheme(): Pick<Host, "theme" | "onThemeChange"> {
  const dark = window.matchMedia("(prefers-color-scheme: dark)");
  const theme = () => (dark.matches ? "dark" : "light");
  return {
    theme,
    onThemeChange: (listener) => dark.addEventListener("change", () => listener(theme())),
  };
}
