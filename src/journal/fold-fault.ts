import { groupBy } from "./order.ts";
import type { JournalRecord } from "./records.ts";
import type { AnswerView, FaultView, MarkView, TrialView, VerdictView } from "./views.ts";

/**
 * The faults of one show, oldest first.
 *
 * @param standing  The show's records that are not withdrawn, in journal order.
 */
export function foldFaults(standing: readonly JournalRecord[]): readonly FaultView[] {
  const byFault = groupBy(standing, ({ body }) => ("fault" in body ? body.fault : null));
  const details = new Map<string, JournalRecord<"dropout.detailed">["body"]>();
  for (const { type, body } of standing)
    if (type === "dropout.detailed") details.set(body.mark, body);
  return standing
    .filter((record) => record.type === "fault.opened")
    .map((opened) => foldFault(opened, byFault.get(opened.id) ?? [], details));
}

function foldFault(
  opened: JournalRecord<"fault.opened">,
  records: readonly JournalRecord[],
  details: ReadonlyMap<string, JournalRecord<"dropout.detailed">["body"]>,
): FaultView {
  const marks: MarkView[] = [];
  const answers = new Map<string, AnswerView>();
  const trials: TrialView[] = [];
  const skipped = new Set<string>();
  let verdict: VerdictView | null = null;
  for (const { id, at, type, body } of records) {
    if (type === "dropout.marked") {
      const detail = details.get(id);
      marks.push({ id, at, links: detail?.links ?? [], place: detail?.place ?? null });
    } else if (type === "check.answered") {
      const { check, outcome } = body;
      // Taken out first, so that the answer stands where it was last given.
      answers.delete(check);
      answers.set(check, { record: id, at, check, outcome });
    } else if (type === "remedy.tried") {
      trials.push({ record: id, at, remedy: body.remedy, result: body.result });
    } else if (type === "step.skipped") {
      skipped.add(body.step);
    } else if (type === "fault.closed") {
      const { causes, ending, remedy, note } = body;
      verdict = { record: id, at, causes, ending, remedy, note };
    }
  }
  return {
    id: opened.id,
    openedAt: opened.at,
    moment: opened.body.moment,
    marks,
    answers: [...answers.values()],
    trials,
    skipped: [...skipped],
    verdict,
  };
}
