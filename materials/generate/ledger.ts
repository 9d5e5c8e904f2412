export function ledger(
  inputs: readonly { name: string; sha256: string }[],
  output: { sha256: string; bytes: number; gzipBytes: number },
): string[] {
  return ['# Ledger', ...inputs.map((i) => `${i.name} ${i.sha256}`), JSON.stringify(output)];
}
