import { afterAll, describe, expect, test } from "vitest";
import { allCorrelations, correlationById } from "../../src/correlations/index.js";
import { compiled, type Inputs, readData } from "./evaluation.js";

/**
 * published: a printed worked example or table; independent: an exact solution or another implementation;
 * comparison: another published law or a limit (weak evidence); pinned: our own earlier output (proves nothing).
 */
interface Check {
  readonly id: string;
  readonly inputs: Inputs;
  readonly of?: string;
  readonly expected: number;
  readonly within: number;
  readonly kind: "published" | "independent" | "comparison" | "pinned";
  readonly ref: string;
}

const checks = readData<readonly Check[]>("correlation-checks.json");

describe.each(["published", "independent", "comparison", "pinned"] as const)("%s values", (kind) => {
  const rows = checks.filter((check) => check.kind === kind);
  test.each(rows.map((check, i) => [`${check.id} ${i + 1}: ${check.ref}`, check] as const))("%s", (_, check) => {
    const got = compiled(correlationById(check.id), Object.keys(check.inputs)).at(check.inputs, check.of);
    const off = Math.abs(got / check.expected - 1);
    expect(off, `${got} against ${check.expected}`).toBeLessThanOrEqual(check.within);
  });
});

const outside: ReadonlySet<string> = new Set(
  checks.filter((check) => check.kind === "published" || check.kind === "independent").map((check) => check.id),
);

/** Records whose constants were confirmed, though not by a number that stands here: how, by id. */
const confirmedElsewhere = readData<Readonly<Record<string, string>>>("confirmed-elsewhere.json");

test("an equation that claims confirmed constants has a check from outside, or says how they were confirmed", () => {
  const claims = allCorrelations.filter((record) => record.confidence === "N" && !outside.has(record.id));
  expect(claims.map((record) => record.id).filter((id) => !(id in confirmedElsewhere))).toEqual([]);
  const known = new Set(claims.map((record) => record.id));
  expect(Object.keys(confirmedElsewhere).filter((id) => !known.has(id))).toEqual([]);
});

afterAll(() => {
  const kinds = ["published", "independent", "comparison", "pinned"] as const;
  const counts = kinds.map((kind) => `${kind} ${checks.filter((check) => check.kind === kind).length}`);
  const held = new Set(checks.filter((check) => check.kind !== "pinned").map((check) => check.id));
  const unverified = allCorrelations
    .filter((record) => !held.has(record.id) && !(record.id in confirmedElsewhere))
    .map((record) => record.id);
  console.info(
    `Checks of correlations: ${counts.join(", ")}.\nHeld by pinned numbers only, so unverified (${unverified.length}): ${unverified.join(", ")}`,
  );
});
