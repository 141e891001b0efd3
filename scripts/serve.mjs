// Serves the built app on this machine and prints its address.   npm run preview
import { existsSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { createStaticServer } from "./static-server.mjs";

/** A browser keeps log and settings for each address, so it is the same each time if it can be. */
const FIRST_PORT = Number(process.env.PORT ?? 4173);
const LAST_PORT = FIRST_PORT + 99;

const folder = fileURLToPath(new URL("../dist", import.meta.url));
if (!existsSync(folder)) {
  console.error('There is no built app yet: run "npm start", or "npm run build" first.');
  process.exit(1);
}
const server = createStaticServer(folder);
for (let port = FIRST_PORT; ; port += 1) {
  try {
    await server.start(port);
    break;
  } catch (error) {
    if (error.code !== "EADDRINUSE" || port >= LAST_PORT) throw error;
  }
}
console.log(`Fadewright is at ${server.url}/   (Ctrl+C ends it)`);
