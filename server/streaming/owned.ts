/** The buffer behind these bytes where it holds nothing else: only then may it move to another thread. */
export function whollyOwned({ buffer, byteOffset, byteLength }: Uint8Array): ArrayBuffer[] {
  return byteLength > 0 && byteOffset === 0 && byteLength === buffer.byteLength && buffer instanceof ArrayBuffer ? [buffer] : [];
}
