export { createEngine, type Engine } from "./engine";
export { cellLine, fieldOffset, readEntry } from "./entry";
export { functionEntries } from "./functions";
export { engineRelease } from "./release";
