/** Turbulent flow in rough tubes, by equivalent sand roughness e_D. */
import type { Correlation } from "./correlation.js";

export const norris1971Rough: Correlation = {
  id: "norris-1971-rough",
  name: "Norris, rough tube factor",
  serves: ["DUCT.TUBE"],
  result: "factor",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  length: "diameter",
  lines: {
    n: "0.68*Pr^0.215",
    Factor: "MIN(f_fs,4)^MIN(n,1)",
  },
  ranges: { f_fs: [1, 4], Pr: [0.6, 6] },
  rangeOrigin: "customary",
  scatter: { value: 0.25, origin: "common practice" },
  source: { work: "norris-1971" },
  confidence: "M",
  note: "From memory. n = 1 above Pr 6; no further gain above f/fs of 4.",
};

export const bhattiShah1987Rough: Correlation = {
  id: "bhatti-shah-1987-rough",
  name: "Bhatti & Shah / Dipprey & Sabersky, fully rough",
  serves: ["DUCT.TUBE"],
  result: "Nu",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  length: "diameter",
  lines: {
    f: "1/(1.8*LOG10(6.9/Re+(e_D/3.7)^1.11))^2",
    Rek: "Re*e_D*SQRT(f/8)",
    Nu: "(f/8)*Re*Pr/(1+SQRT(f/8)*(4.5*Rek^0.2*Pr^0.5-8.48))",
  },
  ranges: { Re: [1e4, 1e7], Pr: [0.5, 5000], e_D: [0.002, 0.05], Rek: [70, 1e5] },
  rangeOrigin: "customary",
  scatter: { value: 0.15, origin: "common practice" },
  source: { work: "bhatti-shah-1987", at: "after Dipprey & Sabersky 1963" },
  confidence: "N",
  note: "Rek = u_tau*ks/nu above 70. Friction by Haaland. The second line is confirmed by an independent open implementation. Between smooth and fully rough take the larger of this and smooth.",
};

export const gnielinskiRoughF: Correlation = {
  id: "gnielinski-rough-f",
  name: "Gnielinski with the rough friction factor",
  serves: ["DUCT.TUBE"],
  result: "Nu",
  extent: "either",
  wall: "either",
  propertiesAt: "bulk",
  length: "diameter",
  lines: {
    f: "1/(1.8*LOG10(6.9/Re+(e_D/3.7)^1.11))^2",
    Nu: "(f/8)*(Re-1000)*Pr/(1+12.7*SQRT(f/8)*(Pr^(2/3)-1))",
  },
  ranges: { Re: [4000, 5e6], Pr: [0.5, 2000], e_D: [0, 0.01] },
  rangeOrigin: "customary",
  scatter: { value: 0.3, origin: "common practice" },
  source: { work: "gnielinski-1976", at: "with Haaland's friction" },
  confidence: "M",
  note: "From memory. Common practice, not the author's claim: overstates heat transfer of really rough walls at moderate Pr.",
};
