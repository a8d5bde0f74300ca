import { bibliography } from "../bibliography.js";

/** The full citation of a work. */
export function fullCitation(work: string, at?: string): string {
  const entry = (bibliography as Readonly<Record<string, { readonly cite: string }>>)[work];
  const cite = entry?.cite ?? work;
  return at === undefined ? cite : `${cite}, ${at}`;
}

/** Names that a capital in front does not spell. */
const spelled: Readonly<Record<string, string>> = {
  mcadams: "McAdams",
  mceligot: "McEligot",
  lefevre: "Le Fevre",
  iapws: "IAPWS",
  vdi: "VDI",
  iso: "ISO",
  astm: "ASTM",
};

/** Authors and year, as verdicts print them: "Churchill & Chu 1975". */
export function shortCitation(work: string): string {
  const parts = work.split("-");
  const year = parts.findIndex((part) => /^\d{4}$/.test(part));
  if (year <= 0) return work;
  const authors = parts.slice(0, year).map((part) => spelled[part] ?? part.charAt(0).toUpperCase() + part.slice(1));
  return `${authors.join(" & ")} ${parts[year]}`;
}
