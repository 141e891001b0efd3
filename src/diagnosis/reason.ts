import { type Check, type Knowledge, NONE_OF_THESE, type Remedy } from "./knowledge.ts";

/** Why this step: two causes that a check tells apart best, or what a remedy most likely cures. */
export type Reason =
  | { readonly kind: "separates"; readonly causes: readonly [string, string] }
  | { readonly kind: "likely-cure"; readonly cause: string }
  | { readonly kind: "saves-the-show" };

/** The two causes that the check is for: probable both, and far apart in its rows. */
function separated(knowledge: Knowledge, masses: Float64Array, check: Check): Reason {
  const likely = knowledge.hypotheses
    .map(({ id }, at) => ({ id, mass: masses[at] ?? 0, row: check.likelihood.get(id) ?? [] }))
    .filter(({ id }) => id !== NONE_OF_THESE)
    .sort((a, b) => b.mass - a.mass);
  let best = -1;
  let causes: readonly [string, string] = ["", ""];
  likely.forEach((a, index) => {
    for (const b of likely.slice(index + 1)) {
      const apart = a.row.reduce((sum, share, at) => sum + Math.abs(share - (b.row[at] ?? 0)), 0);
      if (a.mass * b.mass * apart > best) {
        best = a.mass * b.mass * apart;
        causes = [a.id, b.id];
      }
    }
  });
  return { kind: "separates", causes };
}

function likelyCure(knowledge: Knowledge, masses: Float64Array, remedy: Remedy): Reason {
  let best = -1;
  let cause = "";
  knowledge.hypotheses.forEach(({ id }, at) => {
    const gain = (masses[at] ?? 0) * (remedy.cures.get(id) ?? 0);
    if (gain > best) {
      best = gain;
      cause = id;
    }
  });
  return { kind: "likely-cure", cause };
}

/** @param masses  Probability of each hypothesis, in the order of the knowledge's list. */
export function reasonFor(
  knowledge: Knowledge,
  masses: Float64Array,
  step: Check | Remedy,
): Reason {
  if ("outcomes" in step) return separated(knowledge, masses, step);
  return step.isWorkaround ? { kind: "saves-the-show" } : likelyCure(knowledge, masses, step);
}
