const form = /^[-+]?(\d+\.?\d*|\.\d+)([eE][-+]?\d+)?$/;

/** A decimal number as mesh files write it; NaN for anything else (also for hexadecimal and "Infinity"). */
export function plainNumber(text: string | undefined): number {
  return text !== undefined && form.test(text) ? Number(text) : NaN;
}

/** What a sentence shows of text that cannot be read. */
export function quoted(text: string): string {
  const plain = text.trim().replaceAll(/[^\x20-\x7e]/g, '?');
  return `"${plain.length > 40 ? `${plain.slice(0, 40)}…` : plain}"`;
}
