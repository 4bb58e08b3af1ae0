export default async function globalTeardown() {
  await globalThis.closeTestCluster?.();
}
