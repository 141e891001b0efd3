/** One of several that can be chosen; told by a mark, a line and aria-pressed. */
export function Chip(props: { text: string; isChosen: boolean; onPick: () => void }) {
  return (
    <button type="button" aria-pressed={props.isChosen} onClick={props.onPick}>
      {props.text}
    </button>
  );
}
