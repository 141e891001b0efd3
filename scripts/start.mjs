// From a fresh clone to the running app: packages, build, server.   npm start
import { setUpBuild, setUpPackages } from "./set-up.mjs";

if (!setUpPackages() || !setUpBuild()) process.exit(1);
await import("./serve.mjs");
