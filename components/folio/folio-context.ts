"use client";

import { createContext, type Dispatch, useContext } from "react";
import type { CalculationFile, EvaluateAnswer } from "@/lib/schema";
import type { FolioAction, FolioState } from "./folio-state";

/** What every part of the folio may use. */
export interface FolioContextValue {
  readonly state: FolioState;
  readonly dispatch: Dispatch<FolioAction>;
  readonly answer: EvaluateAnswer;
  /** Changes the file; with `quiet` as part of the change before. */
  readonly edit: (file: CalculationFile, quiet?: boolean) => void;
}

export const FolioContext = createContext<FolioContextValue | null>(null);

export function useFolio(): FolioContextValue {
  const value = useContext(FolioContext);
  if (!value) throw new Error("this component stands outside a folio");
  return value;
}
