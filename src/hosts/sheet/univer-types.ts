/** Names for the parts of the embedded sheet's interface that this page uses. */
import type { createUniver } from "@univerjs/presets";

type Created = ReturnType<typeof createUniver>;

export type Univer = Created["univer"];
export type FUniver = Created["univerAPI"];
export type FWorkbook = NonNullable<ReturnType<FUniver["getActiveWorkbook"]>>;
export type FWorksheet = ReturnType<FWorkbook["getActiveSheet"]>;
export type WorkbookData = ReturnType<FWorkbook["save"]>;
