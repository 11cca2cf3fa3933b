/** Works something out at the first call and keeps it; a failure is tried again. */
export function once<T>(work: () => Promise<T>): () => Promise<T> {
  let kept: Promise<T> | undefined;
  return () => {
    kept ??= work().catch((error: unknown) => {
      kept = undefined;
      throw error;
    });
    return kept;
  };
}
