/** Light, dark, or as the system has it: chosen with one button, remembered. */
import { words } from "../../pane/words.js";

type Theme = "light" | "dark" | "system";

const remembered = "filmbook.theme";
const next: Readonly<Record<Theme, Theme>> = { system: "dark", dark: "light", light: "system" };

export function followTheme(button: HTMLButtonElement, apply: (theme: Theme, isDark: boolean) => void): void {
  const media = window.matchMedia("(prefers-color-scheme: dark)");
  let theme = recall();
  const show = (): void => {
    button.textContent = words.sheet.theme[theme];
    document.documentElement.dataset.theme = theme;
    apply(theme, theme === "dark" || (theme === "system" && media.matches));
  };
  button.addEventListener("click", () => {
    theme = next[theme];
    remember(theme);
    show();
  });
  media.addEventListener("change", show);
  show();
}

function recall(): Theme {
  try {
    const kept = localStorage.getItem(remembered);
    return kept === "light" || kept === "dark" ? kept : "system";
  } catch {
    return "system";
  }
}

function remember(theme: Theme): void {
  try {
    localStorage.setItem(remembered, theme);
  } catch {
    // The choice then lasts as long as the page.
  }
}
