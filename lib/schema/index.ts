export * from "./api";
export * from "./calculation";
export * from "./limits";
export * from "./presentation";
export * from "./results";
export * from "./verdict";
export * from "./version-file";
