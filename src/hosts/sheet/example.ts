/**
 * The prepared workbook, as data: the cabinet of a quayside battery-charging station. Its first sheet teaches the functions in five minutes; the others
 * are the job itself. All figures of the scenario are our own.
 */

export type StyleName =
  | "title"
  | "lead"
  | "step"
  | "note"
  | "head"
  | "headText"
  | "input"
  | "text"
  | "one"
  | "two"
  | "three"
  | "whole"
  | "group"
  | "words";

export interface ExampleCell {
  readonly at: string;
  /** Text from "=" on is a formula. */
  readonly value?: string | number;
  readonly style: StyleName;
}

export interface ExampleSheet {
  readonly name: string;
  /** Widths of the columns from A on, in pixels. */
  readonly widths: readonly number[];
  /** Rows that are higher than usual, by number: text that wraps. */
  readonly heights?: Readonly<Record<number, number>>;
  readonly merged?: readonly string[];
  readonly frozenRows?: number;
  readonly cells: readonly ExampleCell[];
}

/** Cells in a row from one on, all of one style unless they name their own; undefined leaves a cell empty. */
function line(from: string, style: StyleName, ...values: readonly (string | number | undefined)[]): readonly ExampleCell[] {
  const [, letter = "A", row = "1"] = /^([A-Z])(\d+)$/.exec(from) ?? [];
  return values.flatMap((value, i) =>
    value === undefined ? [] : [{ at: `${String.fromCharCode(letter.charCodeAt(0) + i)}${row}`, value, style: headed(style, value) }],
  );
}

const textColumns: ReadonlySet<unknown> = new Set(["verdict", "regime", "face", "part", "coolant"]);

/** A head stands over its column as the column is aligned. */
function headed(style: StyleName, value: string | number): StyleName {
  return style === "head" && textColumns.has(value) ? "headText" : style;
}

/** Empty cells that a spilled block will fill, styled in advance: one style for each column. */
function room(from: string, rows: number, ...styles: readonly StyleName[]): readonly ExampleCell[] {
  const [, letter = "A", row = "1"] = /^([A-Z])(\d+)$/.exec(from) ?? [];
  return Array.from({ length: rows }, (_, down) =>
    styles.map((style, i) => ({ at: `${String.fromCharCode(letter.charCodeAt(0) + i)}${Number(row) + down}`, style })),
  ).flat();
}

/** Later cells win, so that a formula may be put into a room that is already styled. */
function sheet(one: Omit<ExampleSheet, "cells">, ...parts: readonly (readonly ExampleCell[])[]): ExampleSheet {
  const cells = new Map<string, ExampleCell>();
  for (const cell of parts.flat()) cells.set(cell.at, { ...cells.get(cell.at), ...cell });
  return { ...one, cells: [...cells.values()] };
}

const heads = { h: "h [W/(m²·K)]", q: "q [W/m²]", reference: "reference temperature [°C]", rate: "heat rate [W]" };

const startHere = sheet(
  {
    name: "Start here",
    widths: [400, 96, 96, 122, 122, 84, 84, 100, 300],
    heights: { 2: 42 },
    merged: ["A2:I2"],
  },
  line("A1", "title", "Film coefficients for a quayside battery-charging station"),
  line(
    "A2",
    "lead",
    "Five minutes: select any cell with a result and read beside the sheet where its number comes from. Then change a blue input and watch what follows.",
  ),

  line("A4", "step", "1  Type a function into a cell"),
  line("A5", "note", "A plate 0.3 m high at 80 °C in air at 20 °C"),
  line("B5", "two", '=FILM.FREE.PLATE("air",80,20,0.3)'),
  line("C5", "words", "W/(m²·K)"),
  line("A6", "note", "Ask for more: words in braces fill the cells to the right"),
  room("B6", 1, "two", "two", "two", "words"),
  line("B6", "two", '=FILM.FREE.PLATE("air",80,20,0.3,{"h","h low","h high","verdict"})'),

  line("A8", "step", "2  The header row of a table is its request"),
  line("A9", "note", "Walls. One formula, in E10, answers the whole table;"),
  line("A10", "note", "rows left blank stay blank until you fill them."),
  line("B9", "head", "Ts [°C]", "Tb [°C]", "height [m]", heads.h, "h low", "h high", heads.q, "verdict"),
  line("B10", "input", 38, 20, 1.9),
  line("B11", "input", 45, 20, 1.9),
  line("B12", "input", 45, 20, 0.6),
  line("B13", "input", 15, 20, 1.9),
  room("B14", 2, "input", "input", "input"),
  room("E10", 6, "two", "two", "two", "one", "words"),
  line("E10", "two", '=FILM.FREE.PLATE("air",B10:B15,C10:C15,D10:D15,E9:I9)'),

  line("A17", "step", "3  Or one formula a row, to fill down"),
  line("A18", "note", "Round busbars, horizontal. Fill them all:"),
  line("A19", "note", "drag the corner of E19 down to E21"),
  line("B18", "head", "Ts [°C]", "Tb [°C]", "diameter [m]", heads.h),
  line("B19", "input", 65, 35, 0.012),
  line("B20", "input", 75, 35, 0.012),
  line("B21", "input", 85, 35, 0.02),
  room("E19", 3, "two"),
  line("E19", "two", '=FILM.FREE.CYLINDER("air",B19,C19,D19)'),

  line("A23", "step", "4  A column against a row gives the grid"),
  line("A24", "note", "h of a wall by its temperature (down) and its height (across)"),
  line("C24", "head", 0.3, 0.6, 1.2, 1.9),
  line("B25", "head", 30),
  line("B26", "head", 40),
  line("B27", "head", 60),
  line("B28", "head", 80),
  room("C25", 4, "two", "two", "two", "two"),
  line("C25", "two", '=FILM.FREE.PLATE("air",B25:B28,20,C24:F24)'),

  line("A30", "step", "5  Units, tolerances, and what is refused"),
  line("A31", "note", "Text carries its own unit"),
  line("B31", "two", '=FILM.FREE.PLATE("air","176 degF","68 degF","11.81 in")'),
  line("C31", "words", "W/(m²·K), the same plate as in row 5"),
  line("A32", "note", "US units for bare numbers and for results"),
  line("B32", "three", '=FILM.FREE.PLATE("air",176,68,0.984,"h","units=US")'),
  line("C32", "words", "Btu/(h·ft²·°F)"),
  line("A33", "note", "A tolerance widens the bounds"),
  room("B33", 1, "two", "two", "two"),
  line("B33", "two", '=FILM.FREE.PLATE("air","80 ± 5 °C","20 ± 2 °C",0.3,{"h","h low","h high"})'),
  line("A34", "note", "A speed where a length belongs is refused"),
  line("B34", "two", '=FILM.FREE.PLATE("air",80,20,"0.3 m/s")'),
  line("C34", "words", "select B34 and read what to mend"),
  line("A35", "note", "Out of every published range there is no number"),
  line("B35", "two", '=FILM.FREE.PLATE("water",60,20,30)'),
  line("C35", "words", '=FILM.FREE.PLATE("water",60,20,30,"verdict")'),
  line("A37", "note", "Next: the sheets Faces, Charger, Cooling loop and h against T."),
);

const faces = sheet(
  {
    name: "Faces",
    widths: [210, 84, 84, 84, 84, 104, 84, 84, 110, 104, 330],
    frozenRows: 1,
  },
  line("A1", "title", "Faces of the cabinet, summer evening, still air and wind"),
  line("A3", "step", "Walls in still air"),
  line(
    "A4",
    "head",
    "face",
    "Ts [°C]",
    "Tb [°C]",
    "height [m]",
    "area [m²]",
    heads.h,
    "h low",
    "h high",
    heads.rate,
    heads.reference,
    "verdict",
  ),
  line("A5", "text", "quay side"),
  line("A6", "text", "harbour side"),
  line("A7", "text", "door"),
  line("B5", "input", "46 ± 3 °C", 24, 1.9, 2.28),
  line("B6", "input", "38 ± 3 °C", 24, 1.9, 2.28),
  line("B7", "input", "42 ± 3 °C", 24, 1.8, 1.44),
  room("F5", 3, "two", "two", "two", "whole", "one", "words"),
  line("F5", "two", '=FILM.FREE.PLATE("air",B5:B7,C5:C7,D5:D7,F4:K4,N4:N7)'),
  line("N3", "note", "settings, one row a face"),
  line("N4", "head", "area"),
  line("N5", "two", "=E5"),
  line("N6", "two", "=E6"),
  line("N7", "two", "=E7"),

  line("A9", "step", "Roof and underside: the sign of the difference decides which way the air moves"),
  line("A10", "head", "face", "Ts [°C]", "Tb [°C]", "length [m]", "width [m]", heads.h, "h low", "h high", heads.rate, "regime"),
  line("A11", "text", "roof, in the sun"),
  line("A12", "text", "roof, clear night"),
  line("A13", "text", "underside, warm"),
  line("B11", "input", 58, 24, 1.2, 0.8),
  line("B12", "input", 6, 12, 1.2, 0.8),
  line("B13", "input", 34, 24, 1.2, 0.8),
  room("F11", 3, "two", "two", "two", "whole", "words"),
  line("F11", "two", '=FILM.FREE.TOPFACE("air",B11:B12,C11:C12,D11:D12,E11:E12,F10:J10)'),
  line("F13", "two", '=FILM.FREE.UNDERSIDE("air",B13,C13,D13,E13,F10:J10)'),

  line("A15", "step", "Wind along the quay side: speed across, film coefficient and bounds down"),
  line("A16", "head", "wind [m/s]", 1, 2, 5, 10, 20),
  line("A17", "text", "h"),
  line("A18", "text", "h low"),
  line("A19", "text", "h high"),
  line("A20", "text", "verdict"),
  room("B17", 3, "one", "one", "one", "one", "one"),
  room("B20", 1, "words", "words", "words", "words", "words"),
  line("B17", "one", '=FILM.FORCED.PLATE("air",46,24,B16:F16,1.2,A17:A20)'),
  line("A21", "note", "The verdict says where free convection matters beside the wind."),
);

const charger = sheet(
  {
    name: "Charger",
    widths: [250, 110, 92, 92, 92, 110, 84, 84, 110, 320],
  },
  line("A1", "title", "The charger: surfaces that are known by their heat flux"),
  line("A3", "step", "Cover plate in still cabinet air: the flux is given, the temperature is found"),
  line("A4", "head", "part", "flux", "Tb [°C]", "height [m]", "Ts [°C]", "Ts max [°C]", heads.h, "h low", "h high", "verdict"),
  line("A5", "text", "cover, 150 W over 0.36 m²"),
  line("A6", "text", "cover, half load"),
  line("A7", "text", "cover, overload"),
  line("B5", "input", "417 W/m2", 35, 0.6),
  line("B6", "input", "208 W/m2", 35, 0.6),
  line("B7", "input", "625 W/m2", 35, 0.6),
  room("E5", 3, "one", "one", "two", "two", "two", "words"),
  line("E5", "one", '=FILM.FREE.PLATE("air",B5:B7,C5:C7,D5:D7,E4:J4)'),

  line("A9", "step", "Fins blown by the fan: air along each fin, 0.12 m long"),
  line("A10", "head", "air speed [m/s]", "Ts [°C]", "Tb [°C]", "length [m]", heads.h, "h low", "h high", "Re", "regime", "verdict"),
  line("A11", "input", 2, 70, 35, 0.12),
  line("A12", "input", 4, 70, 35, 0.12),
  line("A13", "input", 8, 70, 35, 0.12),
  room("E11", 3, "one", "one", "one", "whole", "words", "words"),
  line("E11", "one", '=FILM.FORCED.PLATE("air",B11:B13,C11:C13,A11:A13,D11:D13,E10:J10)'),
  line("A14", "note", "The same fin with the boundary layer tripped at its edge"),
  room("E14", 1, "one", "one", "one", "whole", "words", "words"),
  line("B14", "input", 70, 35, 0.12),
  line("E14", "one", '=FILM.FORCED.PLATE("air",B14,C14,8,D14,E10:J10,"boundary layer=tripped")'),

  line("A16", "step", "Is one temperature enough for the aluminium fin? Bi below 0.1 says yes"),
  line("A17", "text", "Biot number, half of 3 mm"),
  line("B17", "group", '=FILM.BIOT(E12,"1.5 mm",180)'),
  line("A18", "text", "heat flux into the air at row 12"),
  line("B18", "whole", "=FILM.FLUX(E12,B12,C12)"),
  line("C18", "words", "W/m²"),
);

const loop = sheet(
  {
    name: "Cooling loop",
    widths: [250, 92, 92, 104, 104, 110, 84, 84, 92, 110, 320],
  },
  line("A1", "title", "The cooling loop: tube inside, hose outside"),
  line("A3", "step", "Inside the tube: water against a glycol mixture, by flow"),
  line(
    "A4",
    "head",
    "coolant",
    "wall [°C]",
    "bulk [°C]",
    "flow",
    "diameter",
    heads.h,
    "h low",
    "h high",
    "Re",
    "pressure drop [kPa]",
    "verdict",
  ),
  line("A5", "input", "water", 45, 38, "0.03 kg/s", "12 mm"),
  line("A6", "input", "water", 45, 38, "0.12 kg/s", "12 mm"),
  line("A7", "input", "ethylene glycol 40 %", 45, 38, "0.03 kg/s", "12 mm"),
  line("A8", "input", "ethylene glycol 40 %", 45, 38, "0.12 kg/s", "12 mm"),
  line("A9", "input", "ethylene glycol 40 %", 45, 38, "2 gpm", "0.5 in"),
  room("F5", 5, "whole", "whole", "whole", "whole", "two", "words"),
  line("F5", "whole", "=FILM.DUCT.TUBE(A5:A9,B5:B9,C5:C9,D5:D9,E5:E9,2.5,F4:K4)"),
  line("A10", "note", "The tube is 2.5 m long; without a length the flow counts as developed."),

  line("A12", "step", "Outside the hose, 22 mm, on the quay: wind across it"),
  line("A13", "head", "wind [m/s]", "Ts [°C]", "Tb [°C]", "diameter [m]", heads.h, "h low", "h high", "Re", "verdict"),
  line("A14", "input", 0.5, 36, 12, 0.022),
  line("A15", "input", 3, 36, 12, 0.022),
  line("A16", "input", 12, 36, 12, 0.022),
  room("E14", 3, "one", "one", "one", "whole", "words"),
  line("E14", "one", '=FILM.FORCED.CYLINDER("air",B14:B16,C14:C16,A14:A16,D14:D16,E13:I13)'),

  line("A18", "step", "Properties of the coolant at 38 °C"),
  line("A19", "head", "coolant", "density [kg/m³]", "cp [J/(kg·K)]", "conductivity [W/(m·K)]", "viscosity [mPa·s]", "Pr"),
  line("A20", "input", "water"),
  line("A21", "input", "ethylene glycol 40 %"),
  room("B20", 2, "one", "whole", "three", "three", "two"),
  line("B20", "one", "=FILM.FLUID(A20:A21,38,B19:F19)"),
);

const againstTemperature = sheet(
  {
    name: "h against T",
    widths: [110, 110, 92, 92, 190, 330, 30, 330],
    frozenRows: 4,
  },
  line("A1", "title", "A temperature-dependent boundary for a conduction solver"),
  line(
    "A2",
    "note",
    "Quay-side wall, 1.9 m high, air at 20 °C. The table crosses zero difference: there the limit of the equation stands.",
  ),
  line("A4", "head", "Ts [°C]", heads.h, "h low", "h high", heads.reference, "verdict"),
  ...[-20, -10, 0.5, 10, 18, 20, 22, 30, 40, 50, 60, 70, 80].map((Ts, i) => line(`A${5 + i}`, "input", Ts)),
  room("B5", 13, "two", "two", "two", "one", "words"),
  line("B5", "two", '=FILM.FREE.PLATE("air",A5:A17,20,1.9,B4:F4)'),
  line("A19", "step", "Which bound is the safe one?"),
  line("A20", "note", "The setting concern says what must not happen to the part; the functions then pick the bound."),
  line("A21", "text", "too hot"),
  line("B21", "two", '=FILM.FREE.PLATE("air",60,20,1.9,"h conservative","concern=too hot")'),
  line("A22", "text", "too cold"),
  line("B22", "two", '=FILM.FREE.PLATE("air",60,20,1.9,"h conservative","concern=too cold")'),
);

const checks = sheet(
  {
    name: "Compare and look up",
    widths: [330, 104, 92, 92, 260, 84, 420],
  },
  line("A1", "title", "Every published equation, units, lists"),
  line("A3", "step", "Every equation that serves a wall at 46 °C in air at 24 °C"),
  room("A4", 16, "text", "two", "two", "two", "words", "text", "words"),
  line("A4", "text", '=FILM.FREE.PLATE("air",46,24,1.9,"compare")'),
  line("A22", "step", "One of them by name, and out of its range openly marked"),
  room("B23", 1, "two", "words"),
  line("A23", "note", "McAdams, laminar, on a wall that is too high for it"),
  line("B23", "two", '=FILM.FREE.PLATE("air",46,24,1.9,{"h","verdict"},"equation=McAdams vertical laminar; beyond range=flag")'),
  line("A25", "step", "Units by hand"),
  line("A26", "note", "5 W/(m²·K) in Btu/(h·ft²·°F)"),
  line("B26", "three", '=FILM.UNIT(5,"W/(m²·K)","Btu/(h·ft²·°F)")'),
  line("A27", "note", "30 psi gauge in bar"),
  line("B27", "three", '=FILM.UNIT("30 psig",,"bar")'),
  line("A29", "step", "What surfaces there are"),
  room("A30", 24, "text", "words", "words", "words", "words"),
  line("A30", "text", '=FILM.LIST("surfaces")'),
);

export const example: { readonly name: string; readonly sheets: readonly ExampleSheet[] } = {
  name: "Quayside charging station",
  sheets: [startHere, faces, charger, loop, againstTemperature, checks],
};
