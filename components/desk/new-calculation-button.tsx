"use client";

import { useRouter } from "next/navigation";
import { useSending } from "@/components/account/use-sending";
import { postJson } from "@/components/site/post-json";
import { ProblemMessage } from "@/components/site/problem-message";
import { Button } from "@/components/ui/button";
import type { CalculationFile } from "@/lib/schema";

const empty: CalculationFile = {
  format: "leading-order/1",
  title: "",
  edition: "codata-2022",
  cells: [],
};

/** Starts a calculation, empty or from a file, and opens it. */
export function NewCalculationButton({
  file = empty,
  look = "primary",
  children = "New calculation",
}: {
  file?: CalculationFile;
  look?: "primary" | "plain";
  children?: string;
}) {
  const sending = useSending();
  const router = useRouter();
  const start = async () => {
    const made = await sending.send(() => postJson<{ id: string }>("/api/calculations", { file }));
    if (made) router.push(`/c/${made.id}`);
  };
  return (
    <>
      <Button look={look} onClick={start} disabled={sending.busy}>
        {children}
      </Button>
      <ProblemMessage problem={sending.problem} />
    </>
  );
}
