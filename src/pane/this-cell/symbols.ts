/** Symbols of a typeset equation tell what they are on hover and focus; the arrow keys move among those of a line. */

export function followSymbols(content: HTMLElement): () => void {
  const stop = new AbortController();
  const { signal } = stop;
  content.addEventListener("pointerover", (event) => tell(content, symbolOf(event.target)), { signal });
  content.addEventListener("focusin", (event) => tell(content, symbolOf(event.target)), { signal });
  content.addEventListener("keydown", (event) => move(event), { signal });
  return () => stop.abort();
}

function symbolOf(target: EventTarget | null): Element | undefined {
  return target instanceof Element ? (target.closest("[data-says]") ?? undefined) : undefined;
}

function tell(content: HTMLElement, symbol: Element | undefined): void {
  if (symbol === undefined) return;
  const says = content.querySelector("#symbol-says");
  if (says !== null) says.textContent = symbol.getAttribute("data-says");
  for (const one of content.querySelectorAll(".symbol.told")) one.classList.remove("told");
  symbol.classList.add("told");
}

const moves: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

function move(event: KeyboardEvent): void {
  const by = moves[event.key];
  const symbol = symbolOf(event.target);
  const line = symbol?.closest(".line");
  if (by === undefined || symbol === undefined || line === null || line === undefined) return;
  const symbols = [...line.querySelectorAll(".symbol")];
  const next = symbols[symbols.indexOf(symbol) + by];
  event.preventDefault();
  if (next === undefined) return;
  symbol.setAttribute("tabindex", "-1");
  next.setAttribute("tabindex", "0");
  (next as Element & { focus?(): void }).focus?.();
}
