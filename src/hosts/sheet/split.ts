/** The separator between sheet and pane: dragged, or moved with the arrow keys. It remembers where it was left. */
import { words } from "../../pane/words.js";

const remembered = "filmbook.pane-size";
const least = 240;
const step = 24;

/** Below this width the pane lies under the sheet (the style sheet has the same figure). */
const narrow = "(max-width: 760px)";

export function splitAt(separator: HTMLElement, pane: HTMLElement, frame: HTMLElement): void {
  const media = window.matchMedia(narrow);
  const isBelow = (): boolean => media.matches;
  const room = (): number => (isBelow() ? frame.clientHeight : frame.clientWidth);
  const size = (): number => (isBelow() ? pane.offsetHeight : pane.offsetWidth);

  const set = (wanted: number): void => {
    const most = Math.max(least, room() - 160);
    const bounded = Math.round(Math.min(most, Math.max(Math.min(least, room() / 2), wanted)));
    frame.style.setProperty(isBelow() ? "--pane-height" : "--pane-width", `${bounded}px`);
    separator.setAttribute("aria-valuenow", String(bounded));
    separator.setAttribute("aria-valuemin", String(Math.min(least, Math.round(room() / 2))));
    separator.setAttribute("aria-valuemax", String(most));
    remember(isBelow(), bounded);
    window.dispatchEvent(new Event("resize"));
  };

  const orient = (): void => {
    separator.setAttribute("aria-orientation", isBelow() ? "horizontal" : "vertical");
    separator.setAttribute("aria-label", isBelow() ? words.sheet.separatorBelow : words.sheet.separator);
    set(recall(isBelow()) ?? (isBelow() ? room() * 0.45 : Math.min(440, room() * 0.34)));
  };

  separator.addEventListener("pointerdown", (event) => {
    event.preventDefault();
    separator.setPointerCapture(event.pointerId);
    separator.classList.add("held");
    const from = isBelow() ? event.clientY : event.clientX;
    const before = size();
    const move = (moved: PointerEvent): void => set(before + from - (isBelow() ? moved.clientY : moved.clientX));
    const end = (): void => {
      separator.classList.remove("held");
      separator.removeEventListener("pointermove", move);
      separator.removeEventListener("pointerup", end);
      separator.removeEventListener("pointercancel", end);
    };
    separator.addEventListener("pointermove", move);
    separator.addEventListener("pointerup", end);
    separator.addEventListener("pointercancel", end);
  });

  separator.addEventListener("keydown", (event) => {
    const by = { ArrowLeft: step, ArrowUp: step, ArrowRight: -step, ArrowDown: -step }[event.key];
    const to = by !== undefined ? size() + by : event.key === "Home" ? least : event.key === "End" ? room() : undefined;
    if (to === undefined) return;
    event.preventDefault();
    set(to);
  });

  media.addEventListener("change", orient);
  orient();
}

function remember(isBelow: boolean, size: number): void {
  try {
    localStorage.setItem(`${remembered}${isBelow ? "-below" : ""}`, String(size));
  } catch {
    // A browser that keeps nothing still has a working separator.
  }
}

function recall(isBelow: boolean): number | undefined {
  try {
    const kept = Number(localStorage.getItem(`${remembered}${isBelow ? "-below" : ""}`));
    return kept > 0 ? kept : undefined;
  } catch {
    return undefined;
  }
}
