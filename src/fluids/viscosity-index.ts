/** Viscosity index of lubricants, ASTM D2270, and the viscosity at 100 °C that belongs to an index. Kinematic viscosities in mm²/s. */

/** `[from, to, a, b, c, d, e, f]`: L = a Y² + b Y + c and H = d Y² + e Y + f, Y at 100 °C. The standard's table, from memory. */
const pieces: readonly (readonly [number, number, number, number, number, number, number, number])[] = [
  [2, 3.8, 1.14673, 1.7576, -0.109, 0.84155, 1.5521, -0.077],
  [3.8, 4.4, 3.38095, -15.4952, 33.196, 0.78571, 1.7929, -0.183],
  [4.4, 5, 2.5, -7.2143, 13.812, 0.82143, 1.5679, 0.119],
  [5, 6.4, 0.101, 16.635, -45.469, 0.04985, 9.1613, -18.557],
  [6.4, 7, 3.35714, -23.5643, 78.466, 0.22619, 7.7369, -16.656],
  [7, 7.7, 0.01191, 21.475, -72.87, 0.79762, -0.7321, 14.61],
  [7.7, 9, 0.41858, 16.1558, -56.04, 0.05794, 10.5156, -28.24],
  [9, 12, 0.88779, 7.5527, -16.6, 0.26665, 6.7015, -10.81],
  [12, 15, 0.7672, 10.7972, -38.18, 0.20073, 8.4658, -22.49],
  [15, 18, 0.97305, 5.3135, -2.2, 0.28889, 5.9741, -4.93],
  [18, 22, 0.97256, 5.25, -0.98, 0.24504, 7.416, -16.73],
  [22, 28, 0.91413, 7.4759, -21.82, 0.20323, 9.1267, -34.23],
  [28, 40, 0.87031, 9.7157, -50.77, 0.18411, 10.1015, -46.75],
  [40, 55, 0.84703, 12.6752, -133.31, 0.17029, 11.4866, -80.62],
  [55, 70, 0.85921, 11.1009, -83.19, 0.1713, 11.368, -76.94],
  [70, 1000, 0.83531, 14.6731, -216.246, 0.16841, 11.8493, -96.947],
];

/** Viscosity at 40 °C of an oil of this viscosity at 100 °C and this index (0 to 100). */
function at40(at100: number, index: number): number {
  const [, , a, b, c, d, e, f] = pieces.find(([, to]) => at100 <= to) ?? (pieces[pieces.length - 1] as (typeof pieces)[number]);
  const L = (a * at100 + b) * at100 + c;
  const H = (d * at100 + e) * at100 + f;
  return L - (index / 100) * (L - H);
}

/** mm²/s at 100 °C of an oil of `viscosity40` mm²/s at 40 °C and a viscosity index between 0 and 100: the equations solved by bisection. */
export function viscosityAt100(viscosity40: number, index: number): number {
  let low = 2;
  let high = 1000;
  for (let k = 0; k < 60; k++) {
    const middle = (low + high) / 2;
    if (at40(middle, index) < viscosity40) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
