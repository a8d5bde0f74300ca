/** The standalone page: an open-source spreadsheet with every FILM function, the pane beside it, and edits that survive a reload. */
import { createUniver, LocaleType } from "@univerjs/presets";
import { CalculationMode, UniverSheetsCorePreset } from "@univerjs/preset-sheets-core";
import enUS from "@univerjs/preset-sheets-core/locales/en-US";
import "@univerjs/preset-sheets-core/lib/index.css";
import "../../pane/pane.css";
import "./sheet.css";
import { openPane } from "../../pane/pane.js";
import { words } from "../../pane/words.js";
import { type FunctionEntry, sheetFunctions } from "./functions.js";
import { implementationsFor } from "./implementations.js";
import { forget, keep, keptWorkbook, withoutResults } from "./keeping.js";
import { exampleWorkbook } from "./snapshot.js";
import { splitAt } from "./split.js";
import { followTheme } from "./theme.js";
import { UniverHost } from "./univer-host.js";
import type { FUniver, WorkbookData } from "./univer-types.js";

const keepingPause = 350;
/** What the embedded sheet calls a change of the workbook, as against an action of the user or a state of the screen. */
const mutation = 2;

async function start(): Promise<void> {
  const says = element("kept");
  says.textContent = words.sheet.starting;
  const entries = await metadata();
  const kept = await keptWorkbook().catch(() => undefined);
  const { univer, univerAPI } = createUniver({
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: enUS },
    presets: [
      UniverSheetsCorePreset({
        container: "sheet",
        ribbonType: "simple",
        formula: { ...sheetFunctions(entries, implementationsFor(entries)), initialFormulaComputing: CalculationMode.FORCED },
      }),
    ],
  });
  univerAPI.createWorkbook(kept ?? exampleWorkbook());
  const host = new UniverHost(univer, univerAPI);
  followTheme(element("theme") as HTMLButtonElement, (theme, isDark) => {
    univerAPI.toggleDarkMode(isDark);
    host.setTheme(theme);
  });
  splitAt(element("separator"), element("pane"), element("frame"));
  openPane(element("pane"), host);
  keepEdits(univerAPI, says);
  offerReset(element("reset") as HTMLButtonElement, element("reset-dialog") as HTMLDialogElement);
  says.textContent = "";
  document.documentElement.dataset.ready = "true";
}

/** The same metadata as Excel reads, from the same place. */
async function metadata(): Promise<readonly FunctionEntry[]> {
  const answer = await fetch("functions.json");
  if (!answer.ok) throw new Error(`functions.json: ${answer.status}`);
  const { functions } = (await answer.json()) as { functions: readonly FunctionEntry[] };
  return functions;
}

function element(id: string): HTMLElement {
  const found = document.getElementById(id);
  if (found === null) throw new Error(`the page has no element ${id}`);
  return found;
}

/** Keeps the workbook a moment after each change, and at once when the page is left. */
function keepEdits(api: FUniver, says: HTMLElement): void {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const now = async (): Promise<void> => {
    clearTimeout(timer);
    timer = undefined;
    const workbook = api.getActiveWorkbook();
    if (workbook === null) return;
    try {
      await keep(withoutResults(workbook.save()));
      says.textContent = words.sheet.kept;
    } catch (fault) {
      says.textContent = words.sheet.notKept(fault instanceof Error ? fault.message : String(fault));
    }
  };
  api.addEvent(api.Event.CommandExecuted, ({ type, id }) => {
    if (type !== mutation || id.startsWith("formula.")) return;
    says.textContent = words.sheet.keeping;
    clearTimeout(timer);
    timer = setTimeout(() => void now(), keepingPause);
  });
  const leaving = (): void => {
    if (timer !== undefined) void now();
  };
  window.addEventListener("pagehide", leaving);
  document.addEventListener("visibilitychange", () => document.visibilityState === "hidden" && leaving());
}

function offerReset(button: HTMLButtonElement, dialog: HTMLDialogElement): void {
  button.textContent = words.sheet.reset;
  (dialog.querySelector("p") as HTMLElement).textContent = words.sheet.resetAsk;
  const [no, yes] = [...dialog.querySelectorAll("button")] as [HTMLButtonElement, HTMLButtonElement];
  no.textContent = words.sheet.resetNo;
  yes.textContent = words.sheet.resetYes;
  button.addEventListener("click", () => dialog.showModal());
  dialog.addEventListener("close", () => {
    if (dialog.returnValue === "yes") void forget().finally(() => location.reload());
  });
}

start().catch((fault: unknown) => {
  element("kept").textContent = words.sheet.failed(fault instanceof Error ? fault.message : String(fault));
});

export type { WorkbookData };
