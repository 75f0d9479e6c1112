"use client";

import { Button } from "@/components/ui/button";
import { useFolio } from "./folio-context";
import { SavingLine } from "./saving-line";
import type { Saving } from "./use-saving";

interface FolioBarProps {
  readonly id: string;
  readonly saving: Saving;
  readonly keeping: boolean;
  readonly onKeys: () => void;
  readonly onPin: () => void;
}

/** Above the calculation: whether the work is safe, undo and redo, the keys, and pinning. */
export function FolioBar({ id, saving, keeping, onKeys, onPin }: FolioBarProps) {
  const { state, dispatch } = useFolio();
  return (
    <div className="folio-bar">
      <SavingLine
        id={id}
        status={saving.status}
        base={state.base}
        keeping={keeping}
        hasPending={Object.keys(state.pending).length > 0}
        onRetry={() => void saving.flush()}
      />
      <div className="folio-acts">
        <Button
          look="quiet"
          disabled={state.past.length === 0}
          onClick={() => dispatch({ type: "undo" })}
        >
          undo
        </Button>
        <Button
          look="quiet"
          disabled={state.future.length === 0}
          onClick={() => dispatch({ type: "redo" })}
        >
          redo
        </Button>
        <Button look="quiet" onClick={onKeys}>
          keys
        </Button>
        <Button look="primary" onClick={onPin}>
          pin a version
        </Button>
      </div>
    </div>
  );
}
