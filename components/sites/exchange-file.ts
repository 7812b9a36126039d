/** The content of a file a person picked, or why it can't be one of ours. Nothing is sent yet. */
export type ReadFile =
  { readonly ok: true; readonly file: unknown } | { readonly ok: false; readonly why: string };

export async function readExchangeFile(file: File, mostBytes: number): Promise<ReadFile> {
  if (file.size === 0) return { ok: false, why: `${file.name} is empty. Nothing was changed.` };
  if (file.size > mostBytes) {
    return {
      ok: false,
      why: `${file.name} is larger than ${Math.round(mostBytes / 1_000_000)} MB and was not read. Nothing was changed.`,
    };
  }
  try {
    return { ok: true, file: JSON.parse(await file.text()) as unknown };
  } catch (cause) {
    const where = cause instanceof SyntaxError ? ` (${cause.message})` : '';
    return {
      ok: false,
      why: `${file.name} is not an exchange file: it can’t be read as GeoJSON${where}. Nothing was changed.`,
    };
  }
}
