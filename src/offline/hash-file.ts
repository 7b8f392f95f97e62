/** SHA-256 of a file's bytes as they are, in lower-case hex: its address in the job and on the server. */
export async function hashFile(file: Blob): Promise<string> {
  return hashBytes(await file.arrayBuffer());
}

/** SHA-256 of bytes, in lower-case hex. */
export async function hashBytes(bytes: ArrayBuffer): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', bytes);
  return Array.from(new Uint8Array(digest), (byte) => byte.toString(16).padStart(2, '0')).join('');
}
