import type { Variant } from "./surface.js";

/**
 * The dimensionless groups and closing lines that every surface shares, as algebra. Properties without a suffix are
 * taken where the equation says; `_b` is the bulk, `_w` the wall. Temperatures in kelvin.
 */
export function standardGroups(variant: Variant): Record<string, string> {
  return {
    ...flowLine(variant),
    nu: "mu/rho",
    alpha: "k/(rho*cp)",
    Pr: "mu*cp/k",
    dT: "Ts-Tb",
    Tf: "(Ts+Tb)/2",
    buoyancy: variant.buoyancy === "densities" ? "ABS(rho_b-rho_w)/rho" : "ABS(beta*dT)",
    Gr: "gravity*buoyancy*L^3/nu^2",
    Ra: "gravity*buoyancy*L^3/(nu*alpha)",
    RaStar: "gravity*ABS(beta*q_wall)*L^4/(k*nu*alpha)",
    Re: "u*L/nu",
    Pe: "Re*Pr",
    Ri: "Gr/Re^2",
    Prw: "mu_w*cp_w/k_w",
    Prb: "mu_b*cp_b/k_b",
    Pr_Prw: "Pr/Prw",
    mub_muw: "mu_b/mu_w",
    Tb_Tw: "Tb/Ts",
  };
}

function flowLine(variant: Variant): Record<string, string> {
  if (variant.flow === "mass flow") return { u: "flow/(rho_b*flowArea)" };
  if (variant.flow === "volume flow") return { u: "flow/flowArea" };
  if (variant.flow === "speed") return { u: "flow" };
  return {};
}

/** The last lines of every program: from the Nusselt number to h and the flux. */
export const closingLines: Readonly<Record<string, string>> = {
  h: "Nu*k/L",
  q: "h*(Ts-Tref)",
};
