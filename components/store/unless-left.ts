/** What a file dialog gave; null when the person thought better of it. Any other failure is thrown. */
export async function unlessLeft<T>(dialog: () => Promise<T>): Promise<T | null> {
  try {
    return await dialog();
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') return null;
    throw error;
  }
}
