/** One of a few, all in sight. Chosen is told by a mark and a line, not by colour alone. */
export function Segments<T extends string>(props: {
  label: string;
  options: readonly T[];
  text: Readonly<Record<T, string>>;
  chosen: T;
  /** In two columns, where the words are too long for one row. */
  isWrapped?: boolean;
  onPick: (option: T) => void;
}) {
  return (
    <fieldset class={props.isWrapped ? "segments wrap" : "segments"}>
      <legend class="hidden">{props.label}</legend>
      {props.options.map((option) => (
        <label key={option} class="segment">
          <input
            type="radio"
            name={props.label}
            checked={option === props.chosen}
            onChange={() => props.onPick(option)}
          />
          <span>{props.text[option]}</span>
        </label>
      ))}
    </fieldset>
  );
}
