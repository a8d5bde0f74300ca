import { formatQuantity } from "../quantities/format.js";
import { type Point, valueAt } from "../surfaces/point.js";
import { saturationTemperature } from "../surfaces/scene.js";

const kelvin = 273.15;
/** Contact of eight hours and longer burns skin from about 43 °C, whatever the material (ISO 13732-1, from memory). */
const longContactBurn = kelvin + 43;
/** One minute on bare metal burns from about 51 °C (ISO 13732-1, from memory; rounded down). */
const shortContactBurn = kelvin + 51;
const nearBoiling = 5;
const compressible = 0.3;
const pressurised = 1.5e5;

/** Ends every list of cautions. */
export const practice = "Local codes and licensed practice come first.";

/** What an engineer must be told beside the number. */
export function cautionsAt(point: Point): readonly string[] {
  const { inputs, bulk } = point.scene;
  const list: string[] = [...(inputs.remarks ?? [])];
  const { fluid, pressure } = inputs;
  if (point.variant.buoyancy === "densities") {
    list.push(
      "Buoyancy is taken from the densities at surface and bulk, because expansivity times difference misses their difference by more than 10 %; near a density maximum the flow may split.",
    );
  }
  if (point.surface.motion === "free" && point.scene.spansDensityExtreme()) {
    list.push(
      `The density of ${fluid.name} has an extreme between surface and bulk: the flow may split, and the bounds are widened for it.`,
    );
  }
  if (point.Ts >= longContactBurn) {
    list.push(
      point.Ts >= shortContactBurn
        ? "A touchable surface this hot burns skin: bare metal within a minute from about 51 °C (ISO 13732-1, from memory); guard or insulate it."
        : "A touchable surface above about 43 °C burns skin in long contact (ISO 13732-1, from memory).",
    );
  }
  const dew = fluid.dewPoint?.(inputs.Tb, pressure);
  if (typeof dew === "number" && point.Ts < dew) {
    list.push(
      `The surface is below the dew point (${formatQuantity(dew, "temperature", "SI")}): water condenses on it, and the latent heat is not in h.`,
    );
  }
  const Tsat = bulk.phase === "liquid" ? saturationTemperature(fluid, pressure) : undefined;
  if (Tsat !== undefined && point.Ts > Tsat - nearBoiling) {
    list.push(
      `The surface is within ${nearBoiling} K of boiling (${formatQuantity(Tsat, "temperature", "SI")}): subcooled boiling may raise h.`,
    );
  }
  if (bulk.phase === "liquid" && fluid.freezingPoint !== undefined && Math.min(point.Ts, inputs.Tb) < fluid.freezingPoint + 2) {
    list.push(`Surface or bulk is within 2 K of freezing (${formatQuantity(fluid.freezingPoint, "temperature", "SI")}).`);
  }
  if (fluid.flashPoint !== undefined && Math.max(point.Ts, inputs.Tb) >= fluid.flashPoint) {
    list.push(`At or above the flash point of ${fluid.name} (${formatQuantity(fluid.flashPoint, "temperature", "SI")}): fire hazard.`);
  }
  const speed = valueAt(point, "u");
  if (bulk.speedOfSound !== undefined && speed > compressible * bulk.speedOfSound) {
    list.push(
      `Mach ${(speed / bulk.speedOfSound).toFixed(2)} is above 0.3: the driving temperature is the adiabatic wall's, which this value does not use.`,
    );
  }
  if (pressure > pressurised) list.push("Pressurised fluid: pressure-equipment codes apply.");
  if (point.surface.takesRoughness !== true && (inputs.numbers.sandRoughness ?? inputs.numbers.profileRoughness ?? 0) > 0) {
    list.push("The equations of this surface are for smooth walls: the roughness given has no effect.");
  }
  if (inputs.wall.kind === "flux" && point.runner.record.wall === "isothermal") {
    list.push("No equation for a uniform flux was taken: the one for a single temperature serves with the mean difference.");
  }
  list.push(...(point.surface.cautions?.(point.at, (symbol) => valueAt(point, symbol)) ?? []));
  list.push(...fluid.cautions(inputs.Tb, pressure));
  return list;
}
