/**
 * Flags with which Chromium runs anywhere: without a GPU (WebGL in software), without a network,
 * and, only as root, without the sandbox that root is refused.
 * @returns {string[]}
 */
export const browserFlags = () => [
  ...(process.getuid?.() === 0 ? ['--no-sandbox'] : []),
  '--use-angle=swiftshader',
  '--enable-unsafe-swiftshader',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];
