import setUp from "../../support/browser-global-setup";

/** Serves the built demo in a schema of its own while it is measured; `url` is its address. */
export async function withServedDemo(measure: (url: string) => Promise<void>): Promise<void> {
  const end = await setUp();
  try {
    await measure(process.env.COTTERPIN_TEST_URL as string);
  } finally {
    await end();
  }
}
