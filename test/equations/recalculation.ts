/** An independent spreadsheet program as judge: formulas go into a workbook file, LibreOffice Calc recalculates it, its numbers come back. */
import { execFileSync } from "node:child_process";
import { existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { escapeXml } from "../../src/equations/mathml.js";

/** A number, a text, or a formula that begins with "=". */
export type SheetCell = number | string;

const program = [
  "/usr/bin/soffice",
  "/usr/local/bin/soffice",
  "/usr/bin/libreoffice",
  "/Applications/LibreOffice.app/Contents/MacOS/soffice",
].find(existsSync);

/** Whether the judge is on this machine. Under CI its absence is a failure, elsewhere it is said loudly. */
export function canRecalculate(): boolean {
  if (program !== undefined) return true;
  if (process.env["CI"]) throw new Error("LibreOffice Calc is not installed; under CI the native formulas must be recalculated.");
  console.warn(
    "\n*** LibreOffice Calc is not on this machine: the native formulas are NOT recalculated by a second program in this run. ***\n",
  );
  return false;
}

/** The sheet's values after recalculation, as text with 15 digits. */
export function recalculate(rows: readonly (readonly SheetCell[])[]): readonly (readonly string[])[] {
  const folder = mkdtempSync(join(tmpdir(), "recalculation-"));
  try {
    writeFileSync(join(folder, "sheet.xlsx"), workbook(rows));
    const profile = join(folder, "profile");
    mkdirSync(join(profile, "user"), { recursive: true });
    writeFileSync(join(profile, "user", "registrymodifications.xcu"), alwaysRecalculate);
    const format = "csv:Text - txt - csv (StarCalc):44,34,76,1,,0,false,false,false,false,false,-1";
    const args = [
      `-env:UserInstallation=${pathToFileURL(profile).href}`,
      "--headless",
      "--norestore",
      "--convert-to",
      format,
      "--outdir",
      folder,
      join(folder, "sheet.xlsx"),
    ];
    execFileSync(program as string, args, { stdio: "ignore", timeout: 180_000 });
    const answer = readdirSync(folder).find((name) => name.endsWith(".csv"));
    if (answer === undefined) throw new Error("LibreOffice wrote no sheet.");
    return readFileSync(join(folder, answer), "utf8").trimEnd().split("\n").map(fieldsOf);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

export function columnName(index: number): string {
  return index < 26 ? String.fromCharCode(65 + index) : columnName(Math.floor(index / 26) - 1) + columnName(index % 26);
}

function fieldsOf(line: string): readonly string[] {
  return [...line.matchAll(/("(?:[^"]|"")*"|[^,]*)(?:,|$)/g)].map((found) => (found[1] ?? "").replace(/^"|"$/g, "").replaceAll('""', '"'));
}

const alwaysRecalculate = `<?xml version="1.0" encoding="UTF-8"?>
<oor:items xmlns:oor="http://openoffice.org/2001/registry" xmlns:xs="http://www.w3.org/2001/XMLSchema" xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance">
<item oor:path="/org.openoffice.Office.Calc/Formula/Load"><prop oor:name="OOXMLRecalcMode" oor:op="fuse"><value>0</value></prop></item>
</oor:items>`;

/** The smallest Office Open XML workbook (ECMA-376) with one sheet. */
function workbook(rows: readonly (readonly SheetCell[])[]): Buffer {
  const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
  const relations = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
  const packageRelations = "http://schemas.openxmlformats.org/package/2006/relationships";
  const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>';
  return zip({
    "[Content_Types].xml": `${head}<Types xmlns="http://schemas.openxmlformats.org/package/2006/content-types"><Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/><Default Extension="xml" ContentType="application/xml"/><Override PartName="/xl/workbook.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml"/><Override PartName="/xl/sheet1.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.worksheet+xml"/></Types>`,
    "_rels/.rels": `${head}<Relationships xmlns="${packageRelations}"><Relationship Id="r1" Type="${relations}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
    "xl/workbook.xml": `${head}<workbook xmlns="${main}" xmlns:r="${relations}"><sheets><sheet name="Sheet1" sheetId="1" r:id="r1"/></sheets></workbook>`,
    "xl/_rels/workbook.xml.rels": `${head}<Relationships xmlns="${packageRelations}"><Relationship Id="r1" Type="${relations}/worksheet" Target="sheet1.xml"/></Relationships>`,
    "xl/sheet1.xml": `${head}<worksheet xmlns="${main}"><sheetData>${rows.map(rowXml).join("")}</sheetData></worksheet>`,
  });
}

function rowXml(cells: readonly SheetCell[], row: number): string {
  return `<row r="${row + 1}">${cells.map((cell, column) => cellXml(cell, `${columnName(column)}${row + 1}`)).join("")}</row>`;
}

function cellXml(cell: SheetCell, at: string): string {
  if (typeof cell === "number") return `<c r="${at}"><v>${cell}</v></c>`;
  if (cell.startsWith("=")) return `<c r="${at}"><f>${escapeXml(cell.slice(1))}</f></c>`;
  return `<c r="${at}" t="inlineStr"><is><t>${escapeXml(cell)}</t></is></c>`;
}

/** A zip archive without compression. */
function zip(files: Readonly<Record<string, string>>): Buffer {
  const bodies: Buffer[] = [];
  const directory: Buffer[] = [];
  let offset = 0;
  for (const [name, text] of Object.entries(files)) {
    const [nameBytes, body] = [Buffer.from(name), Buffer.from(text)];
    const fields = Buffer.alloc(26);
    fields.writeUInt16LE(20, 0);
    fields.writeUInt32LE(checksum(body), 10);
    fields.writeUInt32LE(body.length, 14);
    fields.writeUInt32LE(body.length, 18);
    fields.writeUInt16LE(nameBytes.length, 22);
    bodies.push(Buffer.from("PK\x03\x04", "latin1"), fields, nameBytes, body);
    const rest = Buffer.alloc(14);
    rest.writeUInt32LE(offset, 10);
    directory.push(Buffer.from("PK\x01\x02\x14\x00", "latin1"), fields, rest, nameBytes);
    offset += 30 + nameBytes.length + body.length;
  }
  const listing = Buffer.concat(directory);
  const end = Buffer.alloc(18);
  const count = Object.keys(files).length;
  end.writeUInt16LE(count, 4);
  end.writeUInt16LE(count, 6);
  end.writeUInt32LE(listing.length, 8);
  end.writeUInt32LE(offset, 12);
  return Buffer.concat([...bodies, listing, Buffer.from("PK\x05\x06", "latin1"), end]);
}

function checksum(bytes: Buffer): number {
  let sum = 0xffffffff;
  for (const byte of bytes) {
    sum ^= byte;
    for (let bit = 0; bit < 8; bit++) sum = (sum >>> 1) ^ (sum & 1 ? 0xedb88320 : 0);
  }
  return (sum ^ 0xffffffff) >>> 0;
}
