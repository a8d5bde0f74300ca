/** Every string that the pane shows, in one place, ready to be translated. Sentences of findings and problems come from the rooms that make them. */

function list(names: readonly string[]): string {
  return names.length < 2 ? names.join("") : `${names.slice(0, -1).join(", ")} and ${names[names.length - 1]}`;
}

export const words = {
  title: "Filmbook",
  pages: {
    navigation: "Pages of the pane",
    thisCell: "This cell",
    newFormula: "New formula",
    library: "Surfaces and fluids",
    workbook: "Whole workbook",
    cautions: "Cautions",
  },
  loading: "Reading the cell …",
  fault: (what: string): string => `The pane met a fault of its own (${what}). The sheet is not affected; select the cell again.`,

  trouble: {
    formulaUnread: (rest: string): string => `The formula cannot be read from “${rest}” on.`,
    unknownFunction: (name: string): string => `${name} is not a function of this version of Filmbook.`,
    tooMany: (count: number, names: readonly string[]): string =>
      `${count} arguments are given, but the function takes ${names.length}: ${list(names)}.`,
    argument: (name: string, text: string): string =>
      `${name}: what “${text}” comes to is known only to the sheet. Put it into a cell of its own and refer to that cell, and the pane can explain the result.`,
    noSelection: "No cell is selected.",
    notWritten: (why: string): string => `The sheet did not take the change (${why}).`,
  },

  empty: {
    title: "No film coefficient in this cell",
    says: "Select a cell with a FILM function, and this pane shows where its number comes from: inputs, properties, groups, the equation with its published range, bounds and verdict.",
    try: "Or type this into a cell:",
    example: '=FILM.FREE.PLATE("air",80,20,0.3)',
    exampleSays: "a vertical plate 0.3 m high at 80 °C in air at 20 °C",
    compose: "Compose a formula",
  },

  chooser: "FILM functions in this cell",
  cell: (address: string): string => `Cell ${address}`,
  spilledFrom: (address: string): string => `part of the block that ${address} spills`,
  caseOf: (number: number, of: number): string => `case ${number} of ${of}`,
  opens: "opens the formula in the form",

  result: {
    title: "Result",
    asked: (word: string): string => `asked: ${word}`,
    h: "Film coefficient h",
    to: (low: string, high: string): string => `${low} to ${high}`,
    coverage: "about 95 %",
    reference: "Reference temperature",
    flux: "Heat flux q",
    fluxSign: "positive from surface to fluid",
    surface: "Surface temperature",
    notAnswered: "not shown: out of the published range",
    shown: "The cell shows",
    value: "Value",
  },
  verdict: {
    title: "Verdict",
    good: "In range",
    remark: "In range, with a remark",
    bad: "Not covered",
    flagged: "Out of range, shown marked",
    error: "Arguments to mend",
  },

  problems: {
    title: "What to mend",
    offer: "Changes that would mend it",
    flag: "Show the number, openly marked as out of range",
    equation: (name: string): string => `Use ${name}, which is in range`,
    replace: (name: string, text: string): string => `Write ${text} as ${name}`,
    settingsInCells: "The settings stand in cells: add the setting there.",
  },

  ranges: {
    title: "Published range",
    inside: "inside",
    outside: "outside",
    none: "This equation states no limits.",
    interval: (low: string, high: string): string => `${low} to ${high}`,
    origin: (source: string, origin: string): string => `${source}; limits ${origin}`,
    sentence: (symbol: string, value: string, low: string, high: string, within: boolean, source: string): string =>
      `${symbol} is ${value}, ${within ? "inside" : "outside"} the range ${low} to ${high} of ${source}.`,
  },

  equation: {
    title: "Equation",
    source: "Source",
    scatter: (percent: string, origin: string): string => `Scatter ±${percent} % (${origin})`,
    properties: (at: string): string =>
      `Properties at: ${at === "film" ? "the film temperature, mean of surface and bulk" : at === "bulk" ? "the bulk temperature" : at}`,
    confidence: {
      S: "The text of the source was seen.",
      N: "Its constants are confirmed by an exact solution, a worked example or an independent implementation.",
      M: "From memory: check it against the source before you rely on it.",
    } as Readonly<Record<string, string>>,
    symbols: "Symbols",
    symbolHint: "Point at a symbol, or move through them with the arrow keys, to see what it is.",
    maths: (name: string): string => `Equation for ${name}; arrow keys move through its symbols`,
  },

  inputs: {
    title: "Inputs",
    name: "Input",
    given: "In the cell",
    read: "Read as",
    omitted: "not given",
    settings: "Settings",
    none: "none",
    formula: "In the formula",
  },
  state: { title: "Fluid", at: (state: string): string => `At ${state}`, source: "Source of the properties" },
  groups: { title: "Groups and lengths" },
  table: { symbol: "Symbol", meaning: "Meaning", value: "Value", unit: "Unit" },

  bounds: {
    title: "Where the bounds come from",
    says: "Each cause alone would move h by so much; together they make the bounds.",
    down: "down",
    up: "up",
    share: (percent: string): string => `${percent} % of the width`,
    none: "No cause moves h here.",
  },

  compare: {
    title: "Every published equation for this surface",
    says: "h with its bounds on one axis; the upright line is the equation taken.",
    taken: "taken",
    inRange: "in range",
    outside: "out of range",
    none: "no value",
    count: (inRange: number, all: number): string => `${inRange} of ${all} in range`,
  },

  cautions: { title: "Cautions", none: "None for this case. Local codes and licensed practice come first." },

  trace: { title: "Every step", copy: "Copy as text for a report", copied: "Copied.", copyBelow: "Copy the text from here:" },

  report: {
    heading: (id: string, title: string): string => `FILM.${id}: ${title}`,
    formula: "Formula",
    version: (version: string): string => `Filmbook ${version}`,
  },

  sheet: {
    title: "Filmbook: standalone sheet",
    separator: "Width of the pane; arrow keys change it",
    separatorBelow: "Height of the pane; arrow keys change it",
    reset: "Start again with the example",
    resetAsk: "Start again? Everything typed into this sheet is lost; the example comes back.",
    resetYes: "Start again",
    resetNo: "Keep my sheet",
    kept: "Kept in this browser",
    keeping: "Keeping …",
    notKept: (why: string): string => `Not kept: ${why}. Copy what you need before you leave.`,
    theme: { system: "Theme: system", dark: "Theme: dark", light: "Theme: light" },
    starting: "Opening the sheet …",
    failed: (why: string): string => `The sheet could not be opened: ${why}`,
    unreadable:
      "What was kept in this browser could not be read; the example is shown. Your kept sheet is left alone until you change something.",
  },

  excel: {
    notExcel:
      "This page is the Filmbook pane of Excel and found no Excel around it. Open it from the add-in's button, or use the standalone sheet.",
    tooOld: "This version of Excel does not tell the pane which cell is selected.",
  },
};
