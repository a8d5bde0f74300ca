/** The pane inside Excel. */
import "../../pane/pane.css";
import "./taskpane.css";
import { openPane } from "../../pane/pane.js";
import { words } from "../../pane/words.js";
import { ExcelHost } from "./excel-host.js";
import type { ExcelApi, OfficeApi } from "./office-api.js";

async function start(root: HTMLElement): Promise<void> {
  const { Office, Excel } = globalThis as { Office?: OfficeApi; Excel?: ExcelApi };
  const ready = await Office?.onReady();
  if (Office === undefined || Excel === undefined || ready?.host !== "Excel") {
    root.textContent = words.excel.notExcel;
    root.classList.add("pane", "alone");
    return;
  }
  openPane(root, new ExcelHost(Office, Excel));
  document.documentElement.dataset.ready = "true";
}

const root = document.getElementById("pane");
if (root !== null) {
  start(root).catch((fault: unknown) => {
    root.textContent = words.fault(fault instanceof Error ? fault.message : String(fault));
  });
}
