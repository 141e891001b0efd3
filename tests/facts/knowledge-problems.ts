import { type Elicited, fromElicited } from "../../src/diagnosis/elicit.ts";
import {
  CANT_TELL,
  type Knowledge,
  MOMENTS,
  NONE_OF_THESE,
} from "../../src/diagnosis/knowledge.ts";
import type { Wording } from "../../src/facts/wording.ts";

/** Raw sum of a row's words that still counts as one distribution. */
const LEAST_SUM = 0.85;
const GREATEST_SUM = 1.15;
/** Half the summed difference of two rows below which a check tells nobody apart. */
const LEAST_DIFFERENCE = 0.2;
/** Weight that some outcome must give a cause for it to be confirmable. [deciban] */
const CONFIRMING_DB = 6;
/** "Probable" on the scale. */
const SURE_CURE = 0.85;
const ROUNDING = 1e-9;
const DISRUPTIONS = ["none", "one-link", "all-links"];

const repeated = (ids: readonly string[]) => ids.filter((id, at) => ids.indexOf(id) !== at);

function shapeProblems(raw: Elicited): string[] {
  const problems: string[] = [];
  const causes = raw.causes.map(({ id }) => id);
  const steps = [...raw.checks, ...raw.remedies];
  const ids = [causes, steps.map(({ id }) => id), ...raw.checks.map(({ outcomes }) => outcomes)];
  for (const id of ids.flatMap(repeated)) problems.push(`id twice: ${id}`);
  if (causes.at(-1) !== NONE_OF_THESE) problems.push(`last cause is not ${NONE_OF_THESE}`);
  if (!(raw.scale.floorPercent > 0)) problems.push("floor is not above zero");
  for (const { id, ratePerHour } of raw.causes) {
    if (!(ratePerHour > 0)) problems.push(`${id}: rate is not above zero`);
  }
  for (const { id, seconds, earliest, disruption } of steps) {
    if (!/^[a-z]+(-[a-z]+)*$/.test(id)) problems.push(`${id}: not a kebab-case id`);
    if (!(seconds > 0)) problems.push(`${id}: seconds are not above zero`);
    if (!MOMENTS.some((moment) => moment === earliest)) problems.push(`${id}: unknown moment`);
    if (!DISRUPTIONS.includes(disruption)) problems.push(`${id}: unknown disruption`);
    if (earliest === "live" && disruption === "all-links") {
      problems.push(`${id}: would silence everything in live`);
    }
  }
  for (const { id, provedBy, cures } of raw.remedies) {
    if (!raw.checks.some((check) => check.id === provedBy)) {
      problems.push(`${id}: proved by an unknown check`);
    }
    const named = cures.flatMap((row) => row.causes);
    if (named.length === 0) problems.push(`${id}: missing rows`);
    for (const cause of repeated(named)) problems.push(`${id}: two rows for ${cause}`);
    for (const cause of named) {
      if (!causes.includes(cause)) problems.push(`${id}: unknown cause ${cause}`);
    }
    for (const { word } of cures) {
      if (raw.scale.words[word] === undefined) problems.push(`${id}: unknown word ${word}`);
    }
  }
  for (const check of raw.checks) {
    const { id, outcomes, otherwise, rows } = check;
    if (outcomes.length < 2 || outcomes.length > 4) problems.push(`${id}: not 2 to 4 outcomes`);
    if (outcomes.includes(CANT_TELL)) problems.push(`${id}: lists ${CANT_TELL} as an outcome`);
    if (rows.length === 0) problems.push(`${id}: missing rows`);
    const named = rows.flatMap((row) => row.causes);
    for (const cause of repeated(named)) problems.push(`${id}: two rows for ${cause}`);
    for (const cause of named) {
      if (!causes.includes(cause) || cause === NONE_OF_THESE) {
        problems.push(`${id}: unknown cause ${cause}`);
      }
    }
    for (const words of [otherwise, ...rows.map((row) => row.words)]) {
      if (words.length !== outcomes.length) problems.push(`${id}: a word missing or too many`);
      const shares = words.map((word) => raw.scale.words[word]);
      if (shares.includes(undefined)) problems.push(`${id}: unknown word in ${words}`);
      const sum = shares.reduce<number>((total, share) => total + (share ?? 0) / 100, 0);
      if (sum < LEAST_SUM - ROUNDING || sum > GREATEST_SUM + ROUNDING) {
        problems.push(`${id}: words sum to ${sum.toFixed(2)}`);
      }
    }
  }
  return problems;
}

const difference = (a: readonly number[], b: readonly number[]) =>
  a.reduce((sum, share, at) => sum + Math.abs(share - (b[at] ?? 0)) / 2, 0);

/** Mean row of the named causes, each weighing as much as its rate. */
function meanRow(knowledge: Knowledge, check: Knowledge["checks"][number], causes: string[]) {
  const named = knowledge.hypotheses.filter(({ id }) => causes.includes(id));
  const rates = named.reduce((sum, { ratePerHour }) => sum + ratePerHour, 0);
  return check.outcomes.map((_, at) =>
    named.reduce(
      (sum, { id, ratePerHour }) =>
        sum + ((check.likelihood.get(id)?.[at] ?? 0) * ratePerHour) / rates,
      0,
    ),
  );
}

/** The greatest weight that any outcome of any check gives the cause. [deciban] */
function bestConfirmationDb(knowledge: Knowledge, cause: string): number {
  const others = knowledge.hypotheses.map(({ id }) => id).filter((id) => id !== cause);
  const weights = knowledge.checks.flatMap((check) => {
    const rest = meanRow(knowledge, check, others);
    const own = check.likelihood.get(cause) ?? [];
    return own.map((share, at) => 10 * Math.log10(share / (rest[at] ?? 0)));
  });
  return Math.max(...weights);
}

function contentProblems(knowledge: Knowledge): string[] {
  const problems: string[] = [];
  for (const { id, likelihood } of knowledge.checks) {
    const rows = [...likelihood.values()];
    const apart = Math.max(...rows.flatMap((a) => rows.map((b) => difference(a, b))));
    if (apart < LEAST_DIFFERENCE) problems.push(`${id}: separates nothing`);
  }
  const causes = knowledge.hypotheses.filter(({ id }) => id !== NONE_OF_THESE);
  for (const { id } of causes) {
    if (bestConfirmationDb(knowledge, id) < CONFIRMING_DB) {
      problems.push(`${id}: no check can confirm it`);
    }
    const cures = knowledge.remedies.filter(({ isWorkaround }) => !isWorkaround);
    if (!cures.some((remedy) => (remedy.cures.get(id) ?? 0) >= SURE_CURE)) {
      problems.push(`${id}: no remedy cures it`);
    }
  }
  const families = [...new Set(causes.map(({ family }) => family))];
  const members = (family: string) =>
    causes.filter((cause) => cause.family === family).map(({ id }) => id);
  families.forEach((one, at) => {
    for (const other of families.slice(at + 1)) {
      const apart = knowledge.checks.map((check) =>
        difference(
          meanRow(knowledge, check, members(one)),
          meanRow(knowledge, check, members(other)),
        ),
      );
      if (Math.max(...apart) < LEAST_DIFFERENCE)
        problems.push(`${one} and ${other}: not separated`);
    }
  });
  return problems;
}

function textProblems(raw: Elicited, wording: Wording): string[] {
  const problems: string[] = [];
  const compare = (what: string, ids: readonly string[], texts: Readonly<object>) => {
    const written = Object.keys(texts);
    for (const id of ids) if (!written.includes(id)) problems.push(`${what} ${id}: no text`);
    for (const id of written)
      if (!ids.includes(id)) problems.push(`${what} ${id}: text without id`);
  };
  const cautions = [...raw.checks, ...raw.remedies].flatMap((step) => step.cautions);
  compare(
    "cause",
    raw.causes.map(({ id }) => id),
    wording.causes,
  );
  compare("family", [...new Set(raw.causes.map(({ family }) => family))], wording.families);
  compare(
    "check",
    raw.checks.map(({ id }) => id),
    wording.checks,
  );
  compare(
    "remedy",
    raw.remedies.map(({ id }) => id),
    wording.remedies,
  );
  compare("caution", [...new Set(cautions)], wording.cautions);
  for (const [id, { how }] of Object.entries({ ...wording.checks, ...wording.remedies })) {
    if (how.split(/[.?!](?:\s|$)/).filter(Boolean).length > 2)
      problems.push(`${id}: how is too long`);
  }
  for (const { id, outcomes } of raw.checks) {
    const text = wording.checks[id];
    if (text === undefined) continue;
    compare(`${id} outcome`, outcomes, text.outcomes);
    if (text.question.split(/\s+/).length >= 12) problems.push(`${id}: question of twelve words`);
    for (const label of Object.values(text.outcomes)) {
      if (label.length > 32) problems.push(`${id}: label too long: ${label}`);
    }
  }
  return problems;
}

/** Everything that is wrong with the knowledge and its wording, one sentence each. */
export function knowledgeProblems(raw: Elicited, wording: Wording): readonly string[] {
  const problems = [...shapeProblems(raw), ...textProblems(raw, wording)];
  return problems.length > 0 ? problems : contentProblems(fromElicited(raw));
}
