/** One of a few, all in sight. Chosen is told by a mark, a line and aria-checked. */
export function Segments<T extends string>(props: {
  label: string;
  options: readonly T[];
  text: Readonly<Record<T, string>>;
  chosen: T;
  /** In two columns, where the words are too long for one row. */
  isWrapped?: boolean;
  onPick: (option: T) => void;
}) {
  const move = (event: KeyboardEvent, index: number): void => {
    const by =
      event.key === "ArrowRight" || event.key === "ArrowDown"
        ? 1
        : event.key === "ArrowLeft" || event.key === "ArrowUp"
          ? -1
          : 0;
    if (by === 0) return;
    event.preventDefault();
    const count = props.options.length;
    const next = props.options[(index + by + count) % count];
    if (next === undefined) return;
    props.onPick(next);
    const group = (event.currentTarget as HTMLElement).parentElement;
    group?.querySelector<HTMLElement>(`[data-option="${next}"]`)?.focus();
  };
  return (
    <div
      class={props.isWrapped ? "segments wrap" : "segments"}
      role="radiogroup"
      aria-label={props.label}
    >
      {props.options.map((option, index) => (
        // biome-ignore lint/a11y/useSemanticElements: a native radio can't be a 48 px button with its own mark
        <button
          key={option}
          type="button"
          role="radio"
          data-option={option}
          aria-checked={option === props.chosen}
          tabIndex={option === props.chosen ? 0 : -1}
          onClick={() => props.onPick(option)}
          onKeyDown={(event) => move(event, index)}
        >
          {props.text[option]}
        </button>
      ))}
    </div>
  );
}
