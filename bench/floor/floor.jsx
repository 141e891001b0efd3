import { render } from "preact";
import { useState } from "preact/hooks";

/** As little as a page of this kind can be: a heading, and a button that counts its taps. */
function Floor() {
  const [taps, setTaps] = useState(0);
  return (
    <>
      <h1>Floor</h1>
      <button type="button" data-taps={taps} onClick={() => setTaps(taps + 1)}>
        Tapped {taps} times
      </button>
    </>
  );
}

render(<Floor />, document.getElementById("floor"));
void navigator.serviceWorker.register("./sw.js");
