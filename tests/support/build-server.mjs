/** Builds the server before the API tests: its worker threads run from what is built. */
export default async function setup() {
  await import('../../server/scripts/build.mjs');
}
