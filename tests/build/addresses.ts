import type { BuiltFile } from "./built.ts";

/** Names, not addresses: no browser fetches the namespace of an element. */
const NAMESPACES = [
  "http://www.w3.org/2000/svg",
  "http://www.w3.org/1999/xhtml",
  "http://www.w3.org/1999/xlink",
  "http://www.w3.org/1998/Math/MathML",
];

/** Every absolute web address in the text files of the built app, namespaces excepted. */
export function addressOffences(files: readonly BuiltFile[]): string[] {
  return files
    .filter(({ path }) => /\.(js|css|html|svg|webmanifest|json|txt)$/.test(path))
    .flatMap(({ path, bytes }) =>
      [...bytes.toString("utf8").matchAll(/\b(?:https?|wss?):\/\/[^\s"'`<>)\\]*/g)]
        .map(([address]) => address)
        .filter((address) => !NAMESPACES.includes(address))
        .map((address) => `${path} names ${address}`),
    );
}
