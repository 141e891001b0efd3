import type { Words } from "../../models/words.ts";

/** Right where the risk is, before the buttons that answer the step. */
export function CautionList({ ids, words }: { ids: readonly string[]; words: Words }) {
  return (
    <>
      {ids.map((id) => {
        const caution = words.caution(id);
        return (
          caution && (
            <p key={id} class="caution">
              <strong>{caution.title}.</strong> {caution.text}
            </p>
          )
        );
      })}
    </>
  );
}
