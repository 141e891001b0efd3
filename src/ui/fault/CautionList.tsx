import { CAUTION_TEXT } from "../text/cautions.ts";

/** Short, where the risk is; the whole text unfolds. */
export function CautionList({ ids }: { ids: readonly string[] }) {
  return (
    <>
      {ids.map((id) => {
        const caution = CAUTION_TEXT[id];
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
