/** Free convection on blocks and other closed bodies, with one length for the whole body. */
import type { Correlation } from "./correlation.js";

export const yovanovich1987Body: Correlation = {
  id: "yovanovich-1987-body",
  name: "Yovanovich, any convex body, square root of area",
  serves: ["FREE.BLOCK", "FREE.SPHERE"],
  result: "Nu",
  extent: "mean",
  wall: "isothermal",
  propertiesAt: "film",
  length: "square root of wetted area",
  tables: {
    Nu0: {
      of: "body",
      how: "key",
      rows: [
        ["sphere", 3.545],
        ["cube on a face", 3.388],
        ["cube on an edge", 3.388],
        ["cube on a corner", 3.388],
        ["vertical cylinder", 3.444],
        ["horizontal cylinder", 3.444],
      ],
    },
    G: {
      of: "body",
      how: "key",
      rows: [
        ["sphere", 1.014],
        ["cube on a face", 0.951],
        ["cube on an edge", 0.99],
        ["cube on a corner", 1.014],
        ["vertical cylinder", 0.967],
        ["horizontal cylinder", 1.019],
      ],
    },
  },
  lines: {
    F: "0.670/(1+(0.5/Pr)^(9/16))^(4/9)",
    Nu: "Nu0+G*F*Ra^0.25",
  },
  ranges: { Ra: [1, 1e8], Pr: [0.6, 10] },
  rangeOrigin: "customary",
  scatter: { value: 0.1, origin: "common practice" },
  source: { work: "yovanovich-1987" },
  confidence: "M",
  note: "Nu0 of the sphere is exact (2*sqrt(pi)); the other constants are from memory.",
  symbols: {
    body: "sphere, cube on a face, cube on an edge, cube on a corner, vertical cylinder (height = diameter), horizontal cylinder (length = diameter)",
  },
};

export const king1932Block: Correlation = {
  id: "king-1932-block",
  name: "King, blocks and short bodies",
  serves: ["FREE.BLOCK"],
  result: "Nu",
  extent: "mean",
  wall: "isothermal",
  propertiesAt: "film",
  length: "1/(1/width + 1/height)",
  lines: { Nu: "0.55*Ra^0.25" },
  ranges: { Ra: [1e4, 1e9] },
  rangeOrigin: "from memory",
  scatter: { value: 0.3, origin: "common practice" },
  source: { work: "king-1932" },
  confidence: "M",
  note: "From memory. Sparrow & Ansari showed it poor for some shapes (up to 40 %); the constant is printed as 0.60 or 0.52 too. Never a default.",
};

export const lienhard1973Body: Correlation = {
  id: "lienhard-1973-body",
  name: "Lienhard, any body, laminar",
  serves: ["FREE.BLOCK"],
  result: "Nu",
  extent: "mean",
  wall: "isothermal",
  propertiesAt: "film",
  length: "length of travel of the boundary layer",
  lines: { Nu: "0.52*Ra^0.25" },
  ranges: { Ra: [1e4, 1e9], Pr: [0.5, 10] },
  rangeOrigin: "customary",
  scatter: { value: 0.3, origin: "common practice" },
  source: { work: "lienhard-1973" },
  confidence: "M",
  note: "From memory. A first guess; 15 % for common shapes by the author, Pr not much below 1.",
};

export const hassaniHollandsCylinderShort: Correlation = {
  id: "hassani-hollands-cylinder-short",
  name: "Short horizontal cylinder, ends included (Yovanovich form)",
  serves: ["FREE.BLOCK"],
  result: "Nu",
  extent: "mean",
  wall: "isothermal",
  propertiesAt: "film",
  length: "square root of wetted area",
  lines: {
    F: "0.670/(1+(0.5/Pr)^(9/16))^(4/9)",
    Nu: "3.444+1.019*F*Ra^0.25",
  },
  ranges: { Ra: [1, 1e8], Pr: [0.6, 10] },
  rangeOrigin: "from memory",
  scatter: { value: 0.15, origin: "common practice" },
  limit: { of: "Ra", value: 3.444 },
  source: { work: "yovanovich-1987", at: "also Hassani & Hollands, J. Heat Transfer 111 (1989) 363-371" },
  confidence: "M",
  note: "From memory. Length equals diameter only.",
};
