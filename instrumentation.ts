/** What the server starts beside answering requests. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { startBackground } = await import("./lib/background");
  await startBackground();
}
