const known = new Map<string, Promise<string>>();

/** A file of this site as text, fetched once. Rejects if it cannot be had, and then tries again when asked again. */
export function getText(address: string): Promise<string> {
  const text = known.get(address) ?? fetchText(address);
  known.set(address, text);
  text.catch(() => known.delete(address));
  return text;
}

async function fetchText(address: string): Promise<string> {
  const response = await fetch(address);
  if (!response.ok) throw new Error(`${address}: ${response.status}`);
  return response.text();
}
