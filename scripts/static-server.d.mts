import type { ServerResponse } from "node:http";

export interface StaticServer {
  readonly requests: string[];
  readonly url: string;
  start(wantedPort: number): Promise<void>;
  stop(): Promise<void>;
}

export type Intercept = (path: string, response: ServerResponse) => boolean | Promise<boolean>;

export function createStaticServer(folder: string, intercept?: Intercept): StaticServer;
