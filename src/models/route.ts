/** The places of the app as the address names them, and back. */
export type Route =
  | { readonly place: "fault" }
  | { readonly place: "trace"; readonly fault: string; readonly step: string | null }
  | { readonly place: "steps" | "marks" | "close"; readonly fault: string }
  | { readonly place: "mark" }
  | { readonly place: "calculators" }
  | { readonly place: "distance"; readonly query: string }
  | { readonly place: "rig" }
  | { readonly place: "log"; readonly show: string | null }
  | { readonly place: "show" | "settings" | "cautions" };

const PLAIN = new Set(["fault", "mark", "calculators", "rig", "show", "settings", "cautions"]);

/**
 * Reads an address such as "#/fault/ID/close" or "#/calculators/distance?fromM=30". An address
 * that names nothing leads to the place Fault, so that an old or damaged link still opens the app.
 */
export function parseHash(hash: string): Route {
  const [path = "", query = ""] = hash.replace(/^#\/?/, "").split(/\?(.*)/s);
  const [first = "", second, third] = path.split("/").map(decoded);
  if (first === "fault" && second) {
    if (third === "close" || third === "steps" || third === "marks")
      return { place: third, fault: second };
    return { place: "trace", fault: second, step: third ?? null };
  }
  if (first === "calculators" && second === "distance") return { place: "distance", query };
  if (first === "log") return { place: "log", show: second ?? null };
  if (PLAIN.has(first)) return { place: first } as Route;
  return { place: "fault" };
}

export function hashOf(route: Route): string {
  switch (route.place) {
    case "trace":
      return `#/fault/${encodeURIComponent(route.fault)}${
        route.step === null ? "" : `/${encodeURIComponent(route.step)}`
      }`;
    case "steps":
    case "marks":
    case "close":
      return `#/fault/${encodeURIComponent(route.fault)}/${route.place}`;
    case "distance":
      return `#/calculators/distance${route.query === "" ? "" : `?${route.query}`}`;
    case "log":
      return route.show === null ? "#/log" : `#/log/${encodeURIComponent(route.show)}`;
    default:
      return `#/${route.place}`;
  }
}

function decoded(part: string): string {
  try {
    return decodeURIComponent(part);
  } catch (cause) {
    // A stray percent sign in a link somebody typed: taken as it stands.
    if (cause instanceof URIError) return part;
    throw cause;
  }
}
