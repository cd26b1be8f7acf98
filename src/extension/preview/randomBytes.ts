/** Sixteen random bytes from the engine's cryptographic source, as hexadecimal digits. */
export function randomBytes(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  return [...bytes].map((byte) => byte.toString(16).padStart(2, "0")).join("");
}
