import type { Shared } from "../models/surroundings.ts";

/** The share sheet, else the clipboard, else the text has to be shown for copying by hand. */
export async function shareText(title: string, text: string): Promise<Shared> {
  if (typeof navigator.share === "function") {
    const outcome = await offer({ title, text });
    if (outcome !== "refused") return outcome;
  }
  try {
    await navigator.clipboard.writeText(text);
    return "copied";
  } catch (refused) {
    if (refused instanceof DOMException || refused instanceof TypeError) return "shown";
    throw refused;
  }
}

/** The share sheet where it takes files of this kind, else a download. */
export async function shareFile(name: string, text: string): Promise<Shared> {
  // Browsers keep a list of kinds that may be shared; JSON is not on it everywhere, plain text is.
  const file = new File([text], `${name}.txt`, { type: "text/plain" });
  // Files alone: a title beside them breaks some targets.
  if (navigator.canShare?.({ files: [file] })) {
    const outcome = await offer({ files: [file] });
    if (outcome !== "refused") return outcome;
  }
  const link = document.createElement("a");
  link.href = URL.createObjectURL(file);
  link.download = file.name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(link.href), 60_000);
  return "saved";
}

async function offer(data: ShareData): Promise<"shared" | "cancelled" | "refused"> {
  try {
    await navigator.share(data);
    return "shared";
  } catch (cause) {
    if (!(cause instanceof DOMException || cause instanceof TypeError)) throw cause;
    return cause.name === "AbortError" ? "cancelled" : "refused";
  }
}
