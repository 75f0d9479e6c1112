import { ResendButton } from "@/components/account/resend-button";

/** What waits for the person: an address to confirm. Nothing is shown where nothing waits. */
export function Waiting({ email, confirmed }: { email: string; confirmed: boolean }) {
  if (confirmed) return null;
  return (
    <section aria-labelledby="waiting" className="mb-6">
      <h2 id="waiting" className="mb-2 font-sans text-sm font-medium">
        Waiting for you
      </h2>
      <div className="border-l-4 border-sodium pl-3 font-sans text-sm">
        <p>
          Confirm your address: a mail with a link was sent to{" "}
          <span className="break-all">{email}</span>.
        </p>
        <ResendButton />
      </div>
    </section>
  );
}
