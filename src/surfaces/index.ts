import { ductTube } from "./duct-tube.js";
import { forcedCylinder } from "./forced-cylinder.js";
import { forcedPlate } from "./forced-plate.js";
import { freeCylinder } from "./free-cylinder.js";
import { freeTopface, freeUnderside } from "./free-face.js";
import { freePlate } from "./free-plate.js";
import type { Surface } from "./surface.js";

/** Every surface, in the order help lists them. */
export const allSurfaces: readonly Surface[] = [freePlate, freeTopface, freeUnderside, freeCylinder, forcedPlate, forcedCylinder, ductTube];

const byId: ReadonlyMap<string, Surface> = new Map(allSurfaces.map((surface) => [surface.id, surface]));

export function surfaceById(id: string): Surface | undefined {
  return byId.get(id);
}
