import type { Draft } from "../../models/draft.ts";

/** A line or a few lines of free text; what is typed survives a killed app. */
export function DraftField(props: {
  id: string;
  label: string;
  draft: Draft;
  placeholder?: string;
  lines?: "one" | "some";
  inputMode?: "text" | "decimal";
  problem?: string | null;
}) {
  const { id, draft, problem } = props;
  const shared = {
    id,
    placeholder: props.placeholder,
    value: draft.text.value,
    "aria-invalid": Boolean(problem),
    "aria-describedby": problem ? `${id}-problem` : undefined,
  };
  return (
    <div>
      <label class="field-label" for={id}>
        {props.label}
      </label>
      {props.lines === "some" ? (
        <textarea {...shared} onInput={(event) => draft.set(event.currentTarget.value)} />
      ) : (
        <input
          {...shared}
          class="wide"
          type="text"
          autocomplete="off"
          inputMode={props.inputMode ?? "text"}
          onInput={(event) => draft.set(event.currentTarget.value)}
        />
      )}
      {problem && (
        <p class="problem" id={`${id}-problem`} role="alert">
          {problem}
        </p>
      )}
    </div>
  );
}
