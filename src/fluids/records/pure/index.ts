/** The pure and pseudo-pure fluids of the shelf, air first. */
import { pureEntry } from "../../pure-entry.js";
import type { PureRecord } from "../../pure-record.js";
import type { ShelfEntry } from "../../shelf-entry.js";
import { acetone } from "./acetone.js";
import { ammonia } from "./ammonia.js";
import { ammonia2018 } from "./ammonia-2018.js";
import { argon } from "./argon.js";
import { benzene } from "./benzene.js";
import { carbonDioxide } from "./carbon-dioxide.js";
import { carbonMonoxide } from "./carbon-monoxide.js";
import { carbonylSulfide } from "./carbonyl-sulfide.js";
import { cyclohexane } from "./cyclohexane.js";
import { cyclopentane } from "./cyclopentane.js";
import { decamethylcyclopentasiloxane } from "./decamethylcyclopentasiloxane.js";
import { deuterium } from "./deuterium.js";
import { dimethylEther } from "./dimethyl-ether.js";
import { dryAir } from "./dry-air.js";
import { ethane } from "./ethane.js";
import { ethanol } from "./ethanol.js";
import { ethylbenzene } from "./ethylbenzene.js";
import { ethylene } from "./ethylene.js";
import { fluorine } from "./fluorine.js";
import { fluoroketone5112 } from "./fluoroketone-5-1-12.js";
import { heavyWater } from "./heavy-water.js";
import { helium } from "./helium.js";
import { hexamethyldisiloxane } from "./hexamethyldisiloxane.js";
import { hydrogen } from "./hydrogen.js";
import { hydrogenChloride } from "./hydrogen-chloride.js";
import { hydrogenSulfide } from "./hydrogen-sulfide.js";
import { isobutane } from "./isobutane.js";
import { isopentane } from "./isopentane.js";
import { krypton } from "./krypton.js";
import { methane } from "./methane.js";
import { methanol } from "./methanol.js";
import { nButane } from "./n-butane.js";
import { nDecane } from "./n-decane.js";
import { nDodecane } from "./n-dodecane.js";
import { nHeptane } from "./n-heptane.js";
import { nHexane } from "./n-hexane.js";
import { nNonane } from "./n-nonane.js";
import { nOctane } from "./n-octane.js";
import { nPentane } from "./n-pentane.js";
import { neon } from "./neon.js";
import { nitrogen } from "./nitrogen.js";
import { nitrousOxide } from "./nitrous-oxide.js";
import { octamethylcyclotetrasiloxane } from "./octamethylcyclotetrasiloxane.js";
import { octamethyltrisiloxane } from "./octamethyltrisiloxane.js";
import { oxygen } from "./oxygen.js";
import { parahydrogen } from "./parahydrogen.js";
import { propane } from "./propane.js";
import { propylene } from "./propylene.js";
import { r11 } from "./r11.js";
import { r116 } from "./r116.js";
import { r12 } from "./r12.js";
import { r123 } from "./r123.js";
import { r1233zdE } from "./r1233zde.js";
import { r1234yf } from "./r1234yf.js";
import { r1234zeE } from "./r1234zee.js";
import { r1234zeZ } from "./r1234zez.js";
import { r124 } from "./r124.js";
import { r125 } from "./r125.js";
import { r1336mzzE } from "./r1336mzze.js";
import { r134a } from "./r134a.js";
import { r14 } from "./r14.js";
import { r141b } from "./r141b.js";
import { r142b } from "./r142b.js";
import { r143a } from "./r143a.js";
import { r152a } from "./r152a.js";
import { r161 } from "./r161.js";
import { r218 } from "./r218.js";
import { r22 } from "./r22.js";
import { r227ea } from "./r227ea.js";
import { r23 } from "./r23.js";
import { r236fa } from "./r236fa.js";
import { r245fa } from "./r245fa.js";
import { r32 } from "./r32.js";
import { r404A } from "./r404a.js";
import { r407C } from "./r407c.js";
import { r41 } from "./r41.js";
import { r410A } from "./r410a.js";
import { r507A } from "./r507a.js";
import { sulfurDioxide } from "./sulfur-dioxide.js";
import { sulfurHexafluoride } from "./sulfur-hexafluoride.js";
import { toluene } from "./toluene.js";
import { xenon } from "./xenon.js";

/** In the order of the list: air, gases, refrigerants, organic liquids, heavy water. */
const records: readonly PureRecord[] = [
  dryAir,
  ammonia,
  ammonia2018,
  argon,
  carbonDioxide,
  carbonMonoxide,
  carbonylSulfide,
  deuterium,
  ethane,
  ethylene,
  fluorine,
  helium,
  hydrogenChloride,
  hydrogenSulfide,
  hydrogen,
  isobutane,
  krypton,
  methane,
  nButane,
  neon,
  nitrogen,
  nitrousOxide,
  oxygen,
  parahydrogen,
  propane,
  propylene,
  sulfurDioxide,
  sulfurHexafluoride,
  xenon,
  r11,
  r116,
  r12,
  r123,
  r1233zdE,
  r1234yf,
  r1234zeE,
  r1234zeZ,
  r124,
  r125,
  r1336mzzE,
  r134a,
  r14,
  r141b,
  r142b,
  r143a,
  r152a,
  r161,
  r218,
  r22,
  r227ea,
  r23,
  r236fa,
  r245fa,
  r32,
  r404A,
  r407C,
  r41,
  r410A,
  r507A,
  dimethylEther,
  acetone,
  benzene,
  cyclohexane,
  cyclopentane,
  decamethylcyclopentasiloxane,
  ethanol,
  ethylbenzene,
  fluoroketone5112,
  hexamethyldisiloxane,
  isopentane,
  methanol,
  nDecane,
  nDodecane,
  nHeptane,
  nHexane,
  nNonane,
  nOctane,
  nPentane,
  octamethylcyclotetrasiloxane,
  octamethyltrisiloxane,
  toluene,
  heavyWater,
];

const byName = new Map(records.map((record) => [record.name, record] as const));

/** A record by its name; the corresponding-states records name their reference fluid so. */
export function pureRecord(name: string): PureRecord {
  const record = byName.get(name);
  if (!record) throw new Error(`no record of ${name}`);
  return record;
}

export const pureFluids: readonly ShelfEntry[] = records.map((record) => pureEntry(record, pureRecord));

export function pureRecords(): readonly PureRecord[] {
  return records;
}
