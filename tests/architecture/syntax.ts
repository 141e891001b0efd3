import { parseSync } from "vite";

/** A file to judge: its path from the project's root, with "/" between the parts, and its text. */
export interface SourceFile {
  readonly path: string;
  readonly source: string;
}

/** A node of the syntax tree; the fields depend on its type (ESTree with TypeScript's additions). */
export interface SyntaxNode {
  readonly type: string;
  readonly start: number;
  readonly [field: string]: unknown;
}

const isNode = (value: unknown): value is SyntaxNode =>
  typeof value === "object" && value !== null && typeof Reflect.get(value, "type") === "string";

/**
 * Every node of a file, a parent before its children.
 *
 * @throws SyntaxError naming the file, if it does not parse.
 */
export function nodesOf(file: SourceFile): readonly SyntaxNode[] {
  const { program, errors } = parseSync(file.path, file.source);
  const error = errors[0];
  if (error !== undefined) throw new SyntaxError(`${file.path}: ${error.message}`);
  const nodes: SyntaxNode[] = [];
  const visit = (value: unknown): void => {
    if (Array.isArray(value)) for (const item of value) visit(item);
    else if (isNode(value)) {
      nodes.push(value);
      for (const child of Object.values(value)) visit(child);
    }
  };
  visit(program);
  return nodes;
}

/** The node in a field, or null where the field holds none. */
export function childOf(node: SyntaxNode, field: string): SyntaxNode | null {
  const value = node[field];
  return isNode(value) ? value : null;
}

export function childrenOf(node: SyntaxNode, field: string): readonly SyntaxNode[] {
  const value = node[field];
  return Array.isArray(value) ? value.filter(isNode) : [];
}

/** The text of a string literal, or of a template without placeholders; null for anything else. */
export function textOf(node: SyntaxNode | null | undefined): string | null {
  if (node?.type === "Literal" && typeof node["value"] === "string") return node["value"];
  if (node?.type !== "TemplateLiteral" || childrenOf(node, "expressions").length > 0) return null;
  const value = childrenOf(node, "quasis")[0]?.["value"];
  const cooked = typeof value === "object" && value !== null && Reflect.get(value, "cooked");
  return typeof cooked === "string" ? cooked : null;
}

/** The dotted name that an expression spells (`Date.now`, `import.meta.url`), or null. */
export function dottedName(node: SyntaxNode | null): string | null {
  if (node === null) return null;
  if (node.type === "Identifier" || node.type === "JSXIdentifier") return String(node["name"]);
  if (node.type === "MetaProperty") return "import.meta";
  if (node.type !== "MemberExpression") return null;
  const owner = dottedName(childOf(node, "object"));
  const property = childOf(node, "property");
  const name = node["computed"] === true ? textOf(property) : dottedName(property);
  return owner === null || name === null ? null : `${owner}.${name}`;
}

/** `path:line` of a place in a file, as editors understand it. */
export function placeOf(file: SourceFile, node: SyntaxNode): string {
  return `${file.path}:${file.source.slice(0, node.start).split("\n").length}`;
}
