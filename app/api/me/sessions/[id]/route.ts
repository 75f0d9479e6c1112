import { z } from "zod";
import { revokeSession } from "@/lib/auth";
import { HttpProblem, json, route } from "@/lib/http";

/** End one of one's own sessions. */
export const DELETE = route(
  { permission: "signed-in", params: z.object({ id: z.string().max(100) }) },
  async ({ person, params }) => {
    if (!(await revokeSession(person, params.id))) throw new HttpProblem("not-found");
    return json({ ended: true });
  },
);
