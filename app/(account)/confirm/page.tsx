import type { Metadata } from "next";
import Link from "next/link";
import { ConfirmForm } from "@/components/account/confirm-form";
import { PageBody } from "@/components/site/page-body";
import { Message } from "@/components/ui/message";

export const metadata: Metadata = { title: "Confirm your address", referrer: "no-referrer" };

export default async function ConfirmPage({
  searchParams,
}: {
  searchParams: Promise<{ token?: string | string[] }>;
}) {
  const { token } = await searchParams;
  return (
    <PageBody width="narrow">
      <h1 className="mb-6 text-3xl">Confirm your address</h1>
      {typeof token === "string" && token !== "" ? (
        <ConfirmForm token={token} />
      ) : (
        <Message tone="error">
          This address lacks its token. Follow the link in the mail, or ask for a new one in{" "}
          <Link href="/settings" className="link">
            Settings
          </Link>
          .
        </Message>
      )}
    </PageBody>
  );
}
