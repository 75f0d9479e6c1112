import { db } from "@/db";
import { renamePerson } from "@/lib/auth";
import { json, route } from "@/lib/http";
import { profileSchema } from "@/lib/schema";

/** Who is signed in. */
export const GET = route({ permission: "signed-in" }, ({ person }) => {
  const { id, name, email, emailConfirmed } = person;
  return json({ id, name, email, emailConfirmed });
});

/** Change the name one publishes under. */
export const PATCH = route(
  { permission: "signed-in", body: profileSchema },
  async ({ person, body }) => {
    await renamePerson(db(), person.id, body.name);
    return json({ id: person.id, name: body.name });
  },
);
