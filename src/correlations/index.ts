/** Every published equation. A record belongs to the registry by standing as an export in its family's file. */
import * as bank from "./bank.js";
import * as bed from "./bed.js";
import * as bend from "./bend.js";
import * as coil from "./coil.js";
import type { Correlation } from "./correlation.js";
import * as ductAnnulus from "./duct-annulus.js";
import * as ductShape from "./duct-shape.js";
import * as forcedBar from "./forced-bar.js";
import * as forcedCylinder from "./forced-cylinder.js";
import * as forcedPlate from "./forced-plate.js";
import * as forcedSphere from "./forced-sphere.js";
import * as freeBody from "./free-body.js";
import * as freeCylinder from "./free-cylinder.js";
import * as freeFace from "./free-face.js";
import * as freePlate from "./free-plate.js";
import * as freePost from "./free-post.js";
import * as freeSphere from "./free-sphere.js";
import * as liquidMetal from "./liquid-metal.js";
import * as mixed from "./mixed.js";
import * as mixedTube from "./mixed-tube.js";
import * as propertyRatio from "./property-ratio.js";
import * as recovery from "./recovery.js";
import * as rotating from "./rotating.js";
import * as roughPlate from "./rough-plate.js";
import * as roughTube from "./rough-tube.js";
import * as supercritical from "./supercritical.js";
import * as tape from "./tape.js";
import * as tubeDefault from "./tube-default.js";
import * as tubeFriction from "./tube-friction.js";
import * as tubeLaminar from "./tube-laminar.js";
import * as tubeTurbulent from "./tube-turbulent.js";
import * as unheatedLength from "./unheated-length.js";
import * as wind from "./wind.js";

const families: readonly Readonly<Record<string, Correlation>>[] = [
  freePlate,
  freeFace,
  freeCylinder,
  freeSphere,
  freePost,
  freeBody,
  forcedPlate,
  unheatedLength,
  roughPlate,
  recovery,
  forcedCylinder,
  forcedSphere,
  forcedBar,
  bank,
  bed,
  tubeDefault,
  tubeLaminar,
  tubeTurbulent,
  roughTube,
  propertyRatio,
  tubeFriction,
  liquidMetal,
  supercritical,
  ductShape,
  ductAnnulus,
  coil,
  bend,
  tape,
  mixed,
  mixedTube,
  wind,
  rotating,
];

/** In a family in the order of the records' names, so that of one set the general piece stands first. */
export const allCorrelations: readonly Correlation[] = families.flatMap((family) => Object.values(family));

const byId: ReadonlyMap<string, Correlation> = new Map(allCorrelations.map((record) => [record.id, record]));

/** Throws for an unknown id: ids are written by us, never by a user. */
export function correlationById(id: string): Correlation {
  const found = byId.get(id);
  if (found === undefined) throw new Error(`No correlation has the id ${id}.`);
  return found;
}
