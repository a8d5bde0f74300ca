/** The arguments of every FILM function by name and place, from the registries that also feed the functions themselves. */
import { keyOfName } from "../cells/cases.js";
import { stateFunctions } from "../cells/state-functions.js";
import { allSurfaces } from "../surfaces/index.js";

export interface Parameter {
  readonly name: string;
  /** The name under which `explain` and `answer` take it. */
  readonly key: string;
  readonly optional: boolean;
  readonly describe: string;
}

export interface Signature {
  readonly id: string;
  readonly title: string;
  /** In order, `give` and `settings` included where the function has them. */
  readonly parameters: readonly Parameter[];
}

const give: Parameter = { name: "give", key: "give", optional: true, describe: "what comes back: words, or the header row of a table" };
const settings: Parameter = {
  name: "settings",
  key: "settings",
  optional: true,
  describe: 'names and values, or text such as "pressure=2 bar"',
};

function needed(name: string, describe: string): Parameter {
  return { name, key: keyOfName(name), optional: false, describe };
}

function build(): readonly Signature[] {
  const fluid = needed("fluid", "name of the fluid, or a property table");
  const surfaces = allSurfaces.map(
    (surface): Signature => ({
      id: surface.id,
      title: surface.title,
      parameters: [
        fluid,
        needed(surface.wallName, "temperature, or heat flux as text"),
        needed("bulk", "bulk temperature"),
        ...surface.arguments.map((one) => ({ ...needed(one.name, one.describe), optional: one.optional === true })),
        give,
        settings,
      ],
    }),
  );
  const states = stateFunctions.map(
    (one): Signature => ({
      id: one.id,
      title: one.title,
      parameters: [
        ...(one.takesFluid ? [fluid] : []),
        ...one.arguments.map((argument) => needed(argument.name, argument.describe)),
        settings,
      ],
    }),
  );
  return [
    ...surfaces,
    { id: "FLUID", title: "Properties of a fluid", parameters: [fluid, needed("temperature", "of the fluid"), give, settings] },
    ...states,
    {
      id: "UNIT",
      title: "A quantity in another unit",
      parameters: [
        needed("value", "a number, or text with its unit"),
        { ...needed("from", "its unit, empty where the text carries it"), optional: true },
        needed("to", "the unit wanted"),
      ],
    },
    {
      id: "LIST",
      title: "What there is: fluids, surfaces, equations, settings, words, units",
      parameters: [needed("what", "which list"), { ...needed("filter", "words that a row must hold"), optional: true }],
    },
  ];
}

let built: ReadonlyMap<string, Signature> | undefined;

function byId(): ReadonlyMap<string, Signature> {
  built ??= new Map(build().map((one) => [one.id, one]));
  return built;
}

export function signatureOf(id: string): Signature | undefined {
  return byId().get(id);
}

export function allSignatures(): readonly Signature[] {
  return [...byId().values()];
}
