/**
 * The best of the offered encodings that an Accept-Encoding header takes, brotli before gzip; null
 * when it takes none of them.
 */
export function acceptedEncoding(
  header: string | string[] | undefined,
  offered: ReadonlySet<'br' | 'gzip'>,
): 'br' | 'gzip' | null {
  const weights = new Map(
    String(header ?? '')
      .toLowerCase()
      .split(',')
      .map((entry) => {
        const [name = '', ...parameters] = entry.split(';').map((part) => part.trim());
        const q = parameters.find((parameter) => parameter.startsWith('q='));
        return [name, q === undefined ? 1 : Number(q.slice(2)) || 0] as const;
      }),
  );
  for (const encoding of ['br', 'gzip'] as const) {
    if (offered.has(encoding) && (weights.get(encoding) ?? weights.get('*') ?? 0) > 0)
      return encoding;
  }
  return null;
}
