/** "Cautions": what the tool does not know, where people can be hurt, who must check. */
import { version } from "../version.js";
import { type Child, el } from "./node.js";
import type { Page } from "./page.js";
import { words } from "./words.js";

export function cautionsView(): readonly Child[] {
  const { title, lead, parts, version: says } = words.cautionsPage;
  return [
    el("div", { class: "heading" }, el("h2", { id: "page-title" }, title)),
    el("p", {}, lead),
    ...parts.map((part, i) =>
      el(
        "section",
        { class: "part", "aria-labelledby": `caution-${i}` },
        el("h3", { id: `caution-${i}` }, part.title),
        el("ul", { class: "caution-list" }, ...part.items.map((item) => el("li", {}, item))),
      ),
    ),
    el("p", { class: "part quiet small" }, says(version)),
  ];
}

export const cautionsPage: Page = {
  id: "cautions",
  title: words.pages.cautions,
  begin: (frame) => {
    frame.show(cautionsView());
    return () => undefined;
  },
};
