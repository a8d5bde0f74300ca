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

  whatIf: {
    title: "What if …",
    input: "Move one input",
    slider: (name: string): string => `Try another ${name}`,
    says: "Only a trial: nothing in the sheet changes. The upright line is the cell as it stands; where the curve is broken, the equation is out of its range.",
    plot: (name: string, unit: string, h: string): string => `h in ${h} against ${name} in ${unit}, with its bounds`,
    axes: (name: string, unit: string, h: string): string => `h [${h}] with its bounds, against ${name} [${unit}]`,
  },

  cautions: { title: "Cautions", none: "None for this case. Local codes and licensed practice come first." },

  trace: { title: "Every step", copy: "Copy as text for a report", copied: "Copied.", copyBelow: "Copy the text from here:" },

  report: {
    heading: (id: string, title: string): string => `FILM.${id}: ${title}`,
    formula: "Formula",
    version: (version: string): string => `Filmbook ${version}`,
  },

  cautionsPage: {
    title: "What these numbers are, and what they are not",
    lead: "Filmbook evaluates published equations inside their published ranges. It does not know your part. Read this once before you rely on a number.",
    parts: [
      {
        title: "What a verdict says",
        items: [
          "“In range” means that every group of the case lies inside the limits that the source, or custom, gives for its equation. It does not mean that the equation fits your geometry.",
          "Bounds are meant at about 95 %. Where authors published no scatter the figure is customary, and the pane says so beside it.",
          "Out of range there is no number, unless you ask for it with “beyond range=flag”; then it is marked, and its scatter doubles for each decade outside.",
          "An equation marked “from memory” has not been checked against its source here: check it before you rely on it.",
        ],
      },
      {
        title: "What the tool does not know",
        items: [
          "Whether the real surface is as smooth, as flat, as long or as free-standing as the equation supposes: neighbours, corners, brackets, cables and louvres all change the flow.",
          "Whether the approaching flow is uniform and steady, how turbulent it is, and where it really goes. A speed measured at one place is not the speed everywhere.",
          "Fouling, frost, dust, dew, wetting and ageing, unless you put them into the model yourself.",
          "How the temperature varies over the surface. The value is a mean, for one surface temperature or one flux; a local value needs the setting position.",
          "Changes in time. Every value is for a steady state; quick changes, start-up and pulsation are not covered.",
          "Radiation, unless emissivity and surroundings are given: h is convection alone.",
        ],
      },
      {
        title: "Where people can be hurt",
        items: [
          "A hot surface that can be touched burns skin; guard or insulate it. The pane warns from about 43 °C on.",
          "A liquid near its boiling point may boil where it is hottest, and a closed vessel then gains pressure. Pressurised fluids fall under pressure-equipment codes.",
          "Oils near their flash point, and refrigerants or solvents that burn, are a fire hazard, whatever the film coefficient is.",
          "Ammonia, glycols, brines and many refrigerants are toxic, corrosive or displace air. The pane names what it knows of a fluid; the safety data sheet is what counts.",
          "When a part must not become too hot, the low bound of h is the careful one where the fluid cools it, and the high bound where the fluid heats it. The setting concern picks it for you.",
        ],
      },
      {
        title: "Who must check",
        items: [
          "Local codes and licensed practice come first, always.",
          "Whoever signs for the design must have someone with the training for it check the choice of surface, the inputs and the result: by a second method, a measurement, or a published case near to it.",
          "Keep the trace with the calculation: it holds every step, every property with its source, and the version.",
          "When Filmbook, Excel or a fluid’s formulation changes, calculate again before you rely on old values: a workbook keeps what it was saved with.",
        ],
      },
    ],
    version: (version: string): string => `This is Filmbook ${version}. No licence or warranty replaces your own judgement.`,
  },

  library: {
    title: "Surfaces and fluids",
    search: "Search surfaces, equations and fluids",
    placeholder: "such as cylinder, glycol or Zukauskas",
    surfaces: "Surfaces",
    states: "State, groups and units",
    fluids: "Fluids",
    found: (surfaces: number, fluids: number): string =>
      `${surfaces} ${surfaces === 1 ? "function" : "functions"}, ${fluids} ${fluids === 1 ? "fluid" : "fluids"}`,
    nothing: "Nothing here holds all of these words.",
    use: "Use it in a formula",
    useFluid: "Use this fluid in a formula",
    arguments: "Arguments",
    optional: "may be left out",
    settings: "Settings of its own",
    reference: (what: string): string => `h refers to ${what}.`,
    first: (what: string): string => `Taken first: ${what}.`,
    equations: (count: number): string => `${count} published ${count === 1 ? "equation" : "equations"}`,
    ranges: (symbol: string): string => `Where they hold, by ${symbol}`,
    rangeSays: (name: string, symbol: string, low: string, high: string): string => `${name}: ${symbol} ${low} to ${high}`,
    wall: { isothermal: "one temperature", "uniform flux": "uniform flux", either: "either wall condition" } as Readonly<
      Record<string, string>
    >,
    extent: { mean: "mean", local: "local", either: "mean or local" } as Readonly<Record<string, string>>,
    also: "also",
    family: "Family",
    range: "Range",
    uncertainty: "Uncertainty",
    source: "Source",
    plot: (property: string, fluid: string, pressure: string): string => `${property} of ${fluid} against temperature at ${pressure}`,
    noPlot: "There is no single-phase state at 1 atm to plot here.",
    plotted: { density: "density", cp: "specific heat", conductivity: "conductivity", viscosity: "viscosity" },
  },

  compose: {
    title: "New formula",
    editTitle: (address: string): string => `Formula in ${address}`,
    choose: "What is wetted, and by what?",
    search: "Search functions",
    placeholder: "such as tube, plate or Reynolds",
    other: "Choose another function",
    inputs: "Inputs",
    unitOf: (name: string): string => `Unit of ${name}`,
    take: (name: string): string => `from cells: ${name} is taken from those that are selected`,
    takeShort: "from cells",
    optional: "may be left out",
    give: "What comes back",
    giveHint: "With several words the results fill the cells to the right.",
    giveFrom: "Words from cells",
    moreWords: "Another word",
    addWord: "Add",
    removeWord: (word: string): string => `Leave out ${word}`,
    settings: "Settings",
    settingsHint: "Everything left out has its usual value.",
    settingsFrom: "Settings from cells",
    addSetting: "Add a setting",
    settingValue: (name: string): string => `Value of ${name}`,
    removeSetting: (name: string): string => `Leave out ${name}`,
    result: "Result so far",
    waiting: "Fill in what is missing, and the result appears here.",
    formula: "The formula",
    insert: (address: string): string => `Insert into ${address}`,
    change: (address: string): string => `Change ${address}`,
    table: "Or a table of cases",
    vary: "Run through",
    from: "from",
    to: "to",
    rows: "rows",
    insertTable: (address: string): string => `Insert table at ${address}`,
    noTable: "Give the argument to run through a value, and two ends that are numbers.",
    taken: (address: string): string => `There is something in ${address} already.`,
    writeOver: "Write over it",
    inserted: (address: string): string => `Written into ${address}.`,
    noSelection: "Select a cell in the sheet first.",
  },

  workbook: {
    title: "Whole workbook",
    search: "Search results",
    placeholder: "such as Faces, tube or above",
    filter: "Which verdicts to show",
    reading: "Reading the workbook",
    progress: (cells: number, of: number): string => (of === 0 ? "Looking for formulas …" : `${cells} of ${of} formulas`),
    cancel: "Stop",
    again: "Read again",
    read: (count: number): string => `${count} ${count === 1 ? "result" : "results"} read.`,
    cancelled: (count: number): string => `Stopped after ${count} ${count === 1 ? "result" : "results"}; the list is not whole.`,
    none: "There is no FILM function in this workbook yet.",
    answers: "answers",
    more: (count: number): string => `Show more (${count} left)`,
    wentTo: (address: string): string => `${address} is selected.`,
    boundaries: "Boundary conditions to take away",
    boundariesSay:
      "Every result above that has a number: h low, h, h high, the reference temperature it belongs to, and the area where the cell knows it.",
    units: "Units",
    system: { SI: "SI: W/(m²·K), °C, m²", US: "US: Btu/(h·ft²·°F), °F, ft²" },
    write: "Write from the selected cell on",
    save: "Save as CSV",
    tables: "h against the surface temperature",
    tablesSay: "One table a boundary, everything else as it stands in its cell.",
    from: (system: "SI" | "US"): string => `Ts from [${system === "SI" ? "°C" : "°F"}]`,
    to: (system: "SI" | "US"): string => `to [${system === "SI" ? "°C" : "°F"}]`,
    saveTables: "Save the tables as CSV",
    noSpan: "Give two temperatures above absolute zero, the second the higher, and 2 to 500 rows.",
    heads: { cell: "cell", what: "function", fluid: "fluid", verdict: "verdict" },
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
