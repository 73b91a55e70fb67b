/** Light or dark: the system's choice until the user makes another; remembered in this browser. */
export type Theme = "light" | "dark";

const KEY = "stillwall-theme";

export interface ThemeSwitch {
  current(): Theme;
  toggle(): void;
  onChange(listener: (theme: Theme) => void): void;
}

export function startTheme(root: HTMLElement): ThemeSwitch {
  const system = window.matchMedia("(prefers-color-scheme: dark)");
  const listeners: ((theme: Theme) => void)[] = [];
  let chosen = remembered();
  const current = (): Theme => chosen ?? (system.matches ? "dark" : "light");
  const apply = () => {
    root.dataset.theme = current();
    // The grid's controls and their style sheet read this one.
    root.dataset.bsTheme = current();
    for (const listener of listeners) listener(current());
  };
  system.addEventListener("change", apply);
  apply();
  return {
    current,
    toggle() {
      chosen = current() === "dark" ? "light" : "dark";
      remember(chosen);
      apply();
    },
    onChange: (listener) => void listeners.push(listener),
  };
}

function remembered(): Theme | undefined {
  try {
    const stored = localStorage.getItem(KEY);
    return stored === "dark" || stored === "light" ? stored : undefined;
  } catch {
    return undefined; // storage may be switched off; the choice then lasts as long as the page
  }
}

function remember(theme: Theme): void {
  try {
    localStorage.setItem(KEY, theme);
  } catch {
    // as above
  }
}
