// The cell functions as the platform's metadata generator reads them: top-level functions, literal types, the
// description above the tag. Each is one line; what it does is in the rooms before this one.
import { answer } from "./answer.js";

/**
 * Properties of a fluid at a temperature and a pressure: name, value, unit; or the words asked for.
 * @customfunction FLUID FLUID
 * @param fluid Name such as "air", or a property table
 * @param temperature Temperature, °C
 * @param give Words wanted, such as "density"; all of them when left out
 * @param settings Such as "pressure=2 bar"
 * @returns Numbers, texts or errors
 */
export function fluid(fluid: any[][], temperature: any[][], give?: any[][], settings?: any[][]): any[][] {
  return answer("FLUID", { fluid, temperature }, give, settings);
}

/**
 * Reynolds number from speed and length, properties at one temperature.
 * @customfunction REYNOLDS REYNOLDS
 * @param fluid Name such as "air", or a property table
 * @param temperature Temperature of the properties, °C
 * @param speed Speed, m/s
 * @param length Length, m
 * @param settings Such as "pressure=2 bar"
 * @returns Re
 */
export function reynolds(fluid: any[][], temperature: any[][], speed: any[][], length: any[][], settings?: any[][]): any[][] {
  return answer("REYNOLDS", { fluid, temperature, speed, length }, null, settings);
}

/**
 * Prandtl number of a fluid.
 * @customfunction PRANDTL PRANDTL
 * @param fluid Name such as "air", or a property table
 * @param temperature Temperature, °C
 * @param settings Such as "pressure=2 bar"
 * @returns Pr
 */
export function prandtl(fluid: any[][], temperature: any[][], settings?: any[][]): any[][] {
  return answer("PRANDTL", { fluid, temperature }, null, settings);
}

/**
 * Grashof number at the film temperature.
 * @customfunction GRASHOF GRASHOF
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C
 * @param bulk Bulk temperature, °C
 * @param length Length, m
 * @param settings Such as "pressure=2 bar"
 * @returns Gr
 */
export function grashof(fluid: any[][], surface: any[][], bulk: any[][], length: any[][], settings?: any[][]): any[][] {
  return answer("GRASHOF", { fluid, surface, bulk, length }, null, settings);
}

/**
 * Rayleigh number at the film temperature.
 * @customfunction RAYLEIGH RAYLEIGH
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C
 * @param bulk Bulk temperature, °C
 * @param length Length, m
 * @param settings Such as "pressure=2 bar"
 * @returns Ra
 */
export function rayleigh(fluid: any[][], surface: any[][], bulk: any[][], length: any[][], settings?: any[][]): any[][] {
  return answer("RAYLEIGH", { fluid, surface, bulk, length }, null, settings);
}

/**
 * Richardson number, Gr/Re² at the film temperature: whether free convection matters in a forced flow.
 * @customfunction RICHARDSON RICHARDSON
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C
 * @param bulk Bulk temperature, °C
 * @param speed Speed, m/s
 * @param length Length, m
 * @param settings Such as "pressure=2 bar"
 * @returns Ri
 */
export function richardson(fluid: any[][], surface: any[][], bulk: any[][], speed: any[][], length: any[][], settings?: any[][]): any[][] {
  return answer("RICHARDSON", { fluid, surface, bulk, speed, length }, null, settings);
}

/**
 * Nusselt number from a film coefficient, with the fluid's conductivity.
 * @customfunction NUSSELT NUSSELT
 * @param h Film coefficient, W/(m²·K)
 * @param length Length, m
 * @param conductivity Conductivity of the fluid, W/(m·K)
 * @param settings Such as "units=US"
 * @returns Nu
 */
export function nusselt(h: any[][], length: any[][], conductivity: any[][], settings?: any[][]): any[][] {
  return answer("NUSSELT", { h, length, conductivity }, null, settings);
}

/**
 * Biot number from a film coefficient, with the conductivity of the solid.
 * @customfunction BIOT BIOT
 * @param h Film coefficient, W/(m²·K)
 * @param length Length in the solid, m
 * @param solidConductivity Conductivity of the solid, W/(m·K)
 * @param settings Such as "units=US"
 * @returns Bi
 */
export function biot(h: any[][], length: any[][], solidConductivity: any[][], settings?: any[][]): any[][] {
  return answer("BIOT", { h, length, solidConductivity }, null, settings);
}

/**
 * Heat flux h·(surface − reference), W/m², positive from surface to fluid.
 * @customfunction FLUX FLUX
 * @param h Film coefficient, W/(m²·K)
 * @param surface Surface temperature, °C
 * @param reference Temperature that h is taken against, °C
 * @param settings Such as "units=US"
 * @returns q
 */
export function flux(h: any[][], surface: any[][], reference: any[][], settings?: any[][]): any[][] {
  return answer("FLUX", { h, surface, reference }, null, settings);
}

/**
 * A quantity in another unit: FILM.UNIT(72, "degF", "K"), or FILM.UNIT("72 degF", , "K").
 * @customfunction UNIT UNIT
 * @param value Number, or text with its unit
 * @param from Unit of the number; empty when the value carries its own
 * @param to Unit wanted
 * @returns The number in the unit wanted
 */
export function unit(value: any[][], from: any[][], to: any[][]): any[][] {
  return answer("UNIT", { value, from, to });
}

/**
 * A table of what there is: fluids, surfaces, equations, settings, words or units, with ranges and sources.
 * @customfunction LIST LIST
 * @param what "fluids", "surfaces", "equations", "settings", "words" or "units"
 * @param filter Words that a row must hold
 * @returns A table with a head
 */
export function list(what: any[][], filter?: any[][]): any[][] {
  return answer("LIST", { what, filter });
}

/**
 * Film coefficient of free convection on a vertical or tilted plate.
 * @customfunction FREE.PLATE FREE.PLATE
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Temperature of the fluid far away, °C
 * @param height Height along the slope, m
 * @param give Words wanted, such as "Ts [°C]", "h", "verdict"; h when left out
 * @param settings Such as "tilt=30; pressure=2 bar"
 * @returns h, W/(m²·K), or the words asked for
 */
export function freePlate(fluid: any[][], surface: any[][], bulk: any[][], height: any[][], give?: any[][], settings?: any[][]): any[][] {
  return answer("FREE.PLATE", { fluid, surface, bulk, height }, give, settings);
}

/**
 * Film coefficient of free convection on the upper face of a horizontal plate, hot or cold.
 * @customfunction FREE.TOPFACE FREE.TOPFACE
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Temperature of the fluid far away, °C
 * @param length One side, m
 * @param width The other side, m
 * @param give Words wanted; h when left out
 * @param settings Such as "pressure=2 bar"
 * @returns h, W/(m²·K), or the words asked for
 */
export function freeTopface(
  fluid: any[][],
  surface: any[][],
  bulk: any[][],
  length: any[][],
  width: any[][],
  give?: any[][],
  settings?: any[][],
): any[][] {
  return answer("FREE.TOPFACE", { fluid, surface, bulk, length, width }, give, settings);
}

/**
 * Film coefficient of free convection on the lower face of a horizontal plate, hot or cold.
 * @customfunction FREE.UNDERSIDE FREE.UNDERSIDE
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Temperature of the fluid far away, °C
 * @param length One side, m
 * @param width The other side, m
 * @param give Words wanted; h when left out
 * @param settings Such as "pressure=2 bar"
 * @returns h, W/(m²·K), or the words asked for
 */
export function freeUnderside(
  fluid: any[][],
  surface: any[][],
  bulk: any[][],
  length: any[][],
  width: any[][],
  give?: any[][],
  settings?: any[][],
): any[][] {
  return answer("FREE.UNDERSIDE", { fluid, surface, bulk, length, width }, give, settings);
}

/**
 * Film coefficient of free convection on a long horizontal cylinder.
 * @customfunction FREE.CYLINDER FREE.CYLINDER
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Temperature of the fluid far away, °C
 * @param diameter Outside diameter, m
 * @param give Words wanted; h when left out
 * @param settings Such as "pressure=2 bar"
 * @returns h, W/(m²·K), or the words asked for
 */
export function freeCylinder(
  fluid: any[][],
  surface: any[][],
  bulk: any[][],
  diameter: any[][],
  give?: any[][],
  settings?: any[][],
): any[][] {
  return answer("FREE.CYLINDER", { fluid, surface, bulk, diameter }, give, settings);
}

/**
 * Film coefficient of forced convection on a flat plate along the flow: the mean, or local with the setting position.
 * @customfunction FORCED.PLATE FORCED.PLATE
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Free-stream temperature, °C
 * @param speed Free-stream speed, m/s
 * @param length Length along the flow, m
 * @param give Words wanted; h when left out
 * @param settings Such as "boundary layer=tripped"
 * @returns h, W/(m²·K), or the words asked for
 */
export function forcedPlate(
  fluid: any[][],
  surface: any[][],
  bulk: any[][],
  speed: any[][],
  length: any[][],
  give?: any[][],
  settings?: any[][],
): any[][] {
  return answer("FORCED.PLATE", { fluid, surface, bulk, speed, length }, give, settings);
}

/**
 * Film coefficient of forced convection on a long cylinder across the flow.
 * @customfunction FORCED.CYLINDER FORCED.CYLINDER
 * @param fluid Name such as "air", or a property table
 * @param surface Surface temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Free-stream temperature, °C
 * @param speed Free-stream speed, m/s
 * @param diameter Outside diameter, m
 * @param give Words wanted; h when left out
 * @param settings Such as "pressure=2 bar"
 * @returns h, W/(m²·K), or the words asked for
 */
export function forcedCylinder(
  fluid: any[][],
  surface: any[][],
  bulk: any[][],
  speed: any[][],
  diameter: any[][],
  give?: any[][],
  settings?: any[][],
): any[][] {
  return answer("FORCED.CYLINDER", { fluid, surface, bulk, speed, diameter }, give, settings);
}

/**
 * Film coefficient inside a circular tube, laminar to turbulent: the mean from the inlet over the length, or local with position.
 * @customfunction DUCT.TUBE DUCT.TUBE
 * @param fluid Name such as "water", or a property table
 * @param wall Wall temperature, °C, or heat flux out of the part as text ("500 W/m2"; solvers often use the opposite sign)
 * @param bulk Mean temperature of the fluid over the length, °C
 * @param flow Mean speed, m/s, or a flow as text ("0.4 kg/s", "12 gpm")
 * @param diameter Inside diameter, m
 * @param length Heated length from the inlet, m; developed flow when left out
 * @param give Words wanted; h when left out
 * @param settings Such as "sand roughness=50 um"
 * @returns h, W/(m²·K), or the words asked for
 */
export function ductTube(
  fluid: any[][],
  wall: any[][],
  bulk: any[][],
  flow: any[][],
  diameter: any[][],
  length?: any[][],
  give?: any[][],
  settings?: any[][],
): any[][] {
  return answer("DUCT.TUBE", { fluid, wall, bulk, flow, diameter, length }, give, settings);
}
