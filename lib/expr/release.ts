/** The engine's release, recorded in every result: a change of any number raises it. */
export const engineRelease = "1.0.0";
