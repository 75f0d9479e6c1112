import type { Metadata } from "next";
import { redirect } from "next/navigation";
import type { ReactNode } from "react";
import { NameForm } from "@/components/account/name-form";
import { PasswordForm } from "@/components/account/password-form";
import { ResendButton } from "@/components/account/resend-button";
import { SessionList } from "@/components/account/session-list";
import { LightChoice } from "@/components/site/light-choice";
import { PageBody } from "@/components/site/page-body";
import { StatusWord } from "@/components/ui/status-word";
import { listSessions } from "@/lib/auth";
import { currentPerson } from "@/lib/auth/current-person";

export const metadata: Metadata = { title: "Settings" };

/** A part of the settings: what it is about, and its form beside it. */
function Part({ id, title, children }: { id: string; title: string; children: ReactNode }) {
  return (
    <section
      aria-labelledby={id}
      className="grid gap-x-10 gap-y-4 border-t border-rule py-8 md:grid-cols-[12rem_minmax(0,1fr)]"
    >
      <h2 id={id} className="text-xl">
        {title}
      </h2>
      <div className="max-w-[34rem]">{children}</div>
    </section>
  );
}

export default async function SettingsPage() {
  const person = await currentPerson();
  if (!person) redirect("/sign-in?return=/settings");
  return (
    <PageBody>
      <h1 className="mb-8 text-3xl">Settings</h1>
      <Part id="address" title="Address">
        <p className="font-sans text-sm">
          <span className="font-medium break-all">{person.email}</span>{" "}
          {person.emailConfirmed ? (
            <StatusWord status="holds">confirmed</StatusWord>
          ) : (
            <StatusWord status="notice">not confirmed</StatusWord>
          )}
        </p>
        {!person.emailConfirmed && (
          <div className="mt-2 font-sans text-sm">
            <p>A mail with a link was sent to it; the link is good for 48 hours.</p>
            <ResendButton />
          </div>
        )}
      </Part>
      <Part id="name" title="Name">
        <NameForm name={person.name} />
      </Part>
      <Part id="password" title="Password">
        <PasswordForm email={person.email} />
      </Part>
      <Part id="sessions" title="Sessions">
        <SessionList sessions={await listSessions(person)} />
      </Part>
      <Part id="light" title="Day and night">
        <LightChoice />
        <p className="mt-2 font-sans text-sm text-faint">Kept in this browser.</p>
      </Part>
    </PageBody>
  );
}
