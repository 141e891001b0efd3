import { type ReadonlySignal, signal } from "@preact/signals";

/** The last error that nothing else caught: shown as one line, never a reload. */
export interface MishapModel {
  /** Text for whoever mends the app; null while nothing has gone wrong. */
  readonly details: ReadonlySignal<string | null>;
  report(cause: unknown): void;
  hide(): void;
}

export function createMishapModel(): MishapModel {
  const details = signal<string | null>(null);
  return {
    details,
    report: (cause) => {
      details.value =
        cause instanceof Error
          ? `${cause.name}: ${cause.message}\n${cause.stack ?? ""}`
          : String(cause);
    },
    hide: () => {
      details.value = null;
    },
  };
}
