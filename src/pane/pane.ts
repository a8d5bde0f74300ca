/** The frame of the pane: pages, the way between them, the theme. The host is only known by its few verbs. */
import { cautionsPage } from "./cautions-page.js";
import { newFormulaPage } from "./compose/page.js";
import type { HostFacts, SheetHost } from "./host.js";
import { libraryPage } from "./library/page.js";
import { el } from "./node.js";
import type { Errand, Frame, Page, PageId } from "./page.js";
import { render, show } from "./render.js";
import { thisCellPage } from "./this-cell/page.js";
import { words } from "./words.js";
import { workbookPage } from "./workbook/page.js";

export const allPages: readonly Page[] = [thisCellPage, newFormulaPage, libraryPage, workbookPage, cautionsPage];

/** Opens the pane inside an element; the answer closes it. */
export function openPane(root: HTMLElement, host: SheetHost, pages: readonly Page[] = allPages): () => void {
  const pane = new Pane(root, host, pages);
  return () => pane.close();
}

class Pane {
  private readonly content: HTMLElement;
  private readonly says: HTMLElement;
  private endPage: () => void = () => undefined;
  private current: Frame | undefined;
  private readonly stopTheme: () => void;

  constructor(
    private readonly root: HTMLElement,
    private readonly host: SheetHost,
    private readonly pages: readonly Page[],
  ) {
    root.classList.add("pane");
    this.content = render(
      el("div", { class: "page", id: "page", role: "region", "aria-labelledby": "page-title", tabindex: 0 }),
    ) as HTMLElement;
    this.says = render(el("p", { class: "says", role: "status" })) as HTMLElement;
    if (pages.length > 1) root.replaceChildren(render(this.head()), this.content, this.says);
    else root.replaceChildren(this.content, this.says);
    void this.followTheme();
    this.stopTheme = host.onThemeChanged?.(() => void this.followTheme()) ?? ((): void => undefined);
    this.open(pages[0]?.id ?? "this-cell", {});
  }

  close(): void {
    this.endPage();
    this.stopTheme();
    this.root.replaceChildren();
  }

  private head(): ReturnType<typeof el> {
    const tab = (page: Page): ReturnType<typeof el> =>
      el("li", {}, el("button", { type: "button", class: "tab", id: `tab-${page.id}`, click: () => this.open(page.id, {}) }, page.title));
    return el("nav", { class: "head", "aria-label": words.pages.navigation }, el("ul", { class: "tabs" }, ...this.pages.map(tab)));
  }

  private open(id: PageId, errand: Errand): void {
    const page = this.pages.find((one) => one.id === id);
    if (page === undefined) return;
    this.endPage();
    for (const tab of this.root.querySelectorAll(".tab")) {
      if (tab.id === `tab-${id}`) tab.setAttribute("aria-current", "page");
      else tab.removeAttribute("aria-current");
    }
    this.says.textContent = "";
    this.content.replaceChildren();
    this.content.scrollTop = 0;
    const frame = this.frame();
    this.current = frame;
    this.endPage = page.begin(frame, errand);
  }

  /** What a page has left under way when it is left must not appear in the next one. */
  private frame(): Frame {
    const frame: Frame = {
      host: this.host,
      content: this.content,
      show: (children) => {
        if (this.current === frame) show(this.content, children);
      },
      open: (page, errand = {}) => this.open(page, errand),
      has: (page) => this.pages.some((one) => one.id === page),
      say: (sentence) => {
        if (this.current === frame) this.says.textContent = sentence;
      },
    };
    return frame;
  }

  private async followTheme(): Promise<void> {
    const facts: HostFacts | undefined = await this.host.facts().catch(() => undefined);
    this.root.ownerDocument.documentElement.dataset.theme = facts?.theme ?? "system";
  }
}
