/** "Surfaces and fluids": a search over everything there is, each entry made when it is folded out. */
import { el } from "../node.js";
import type { Frame, Page } from "../page.js";
import { show } from "../render.js";
import { words } from "../words.js";
import { library, searched } from "./entries.js";
import { type LibraryActions, libraryBody, libraryHead } from "./view.js";

const pause = 80;

export const libraryPage: Page = {
  id: "library",
  title: words.pages.library,
  begin: (frame) => {
    let search = "";
    let timer: ReturnType<typeof setTimeout> | undefined;
    const unfolded = new Set<string>();
    const actions: LibraryActions = {
      search: (text) => {
        search = text;
        clearTimeout(timer);
        timer = setTimeout(refresh, pause);
      },
      unfold: (id) => {
        unfolded.add(id);
        refresh();
      },
      ...uses(frame),
    };
    // The box stays as it is while one types: only what stands below it is made anew.
    frame.show([...libraryHead(actions), el("div", { id: "library-body" })]);
    const body = frame.content.querySelector("#library-body") as HTMLElement;
    function refresh(): void {
      show(body, libraryBody({ search, found: searched(library(), search), unfolded }, actions));
    }
    refresh();
    return () => clearTimeout(timer);
  },
};

function uses(frame: Frame): Pick<LibraryActions, "useFunction" | "useFluid"> {
  if (!frame.has("new-formula")) return {};
  return {
    useFunction: (functionId) => frame.open("new-formula", { functionId }),
    useFluid: (fluid) => frame.open("new-formula", { fluid }),
  };
}
