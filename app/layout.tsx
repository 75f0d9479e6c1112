import "katex/dist/katex.min.css";
import "./globals.css";
import type { Metadata, Viewport } from "next";
import { headers } from "next/headers";
import type { ReactNode } from "react";
import { lightScript } from "@/components/site/light-script";
import { SiteFooter } from "@/components/site/site-footer";
import { SiteHeader } from "@/components/site/site-header";
import { currentPerson } from "@/lib/auth/current-person";
import { settings } from "@/lib/settings";

const description =
  "A shared calculator for theoretical astrophysics: estimates in cells, kept in versions, citable from a paper.";

export function generateMetadata(): Metadata {
  return {
    metadataBase: new URL(settings().appUrl),
    title: { default: "Leading Order", template: "%s · Leading Order" },
    description,
    openGraph: { siteName: "Leading Order", type: "website", title: "Leading Order", description },
  };
}

export const viewport: Viewport = {
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#faf7f0" },
    { media: "(prefers-color-scheme: dark)", color: "#12131b" },
  ],
};

const early = ["spectral-latin-400-normal", "spectral-latin-600-normal", "instrument-sans-latin"];

export default async function Layout({ children }: { children: ReactNode }) {
  const nonce = (await headers()).get("x-nonce") ?? undefined;
  const person = await currentPerson();
  return (
    <html lang="en-GB" suppressHydrationWarning>
      <head>
        {early.map((font) => (
          <link
            key={font}
            rel="preload"
            href={`/fonts/${font}.woff2`}
            as="font"
            type="font/woff2"
            crossOrigin="anonymous"
          />
        ))}
        {/* Browsers hide the nonce from scripts, so it differs from what the server wrote. */}
        <script
          nonce={nonce}
          suppressHydrationWarning
          // biome-ignore lint/security/noDangerouslySetInnerHtml: a constant of ours.
          dangerouslySetInnerHTML={{ __html: lightScript }}
        />
      </head>
      <body>
        <a href="#main" className="skip-link">
          Skip to the content
        </a>
        <SiteHeader person={person} />
        {children}
        <SiteFooter />
      </body>
    </html>
  );
}
