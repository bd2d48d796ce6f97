import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { extname, join, relative, sep } from 'node:path';
import { acceptedEncoding } from './accepted-encoding';

interface StaticFile {
  file: string;
  type: string;
  etag: string;
  /** The name holds a hash of the content: it may be kept for ever. */
  hashed: boolean;
  /** Encodings that stand ready beside the file. */
  encodings: ReadonlySet<'br' | 'gzip'>;
}

export interface StaticFiles {
  /** Answers when the path names a file; false when it does not. */
  serve(path: string, request: IncomingMessage, response: ServerResponse): Promise<boolean>;
  /** CSP hashes of the scripts and style sheets: 'self' covers these files already. */
  hashes: ReadonlySet<string>;
}

const types: Record<string, string> = {
  '.css': 'text/css; charset=utf-8',
  '.ico': 'image/x-icon',
  '.jpg': 'image/jpeg',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json',
  '.mjs': 'text/javascript; charset=utf-8',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.txt': 'text/plain; charset=utf-8',
  '.wasm': 'application/wasm',
  '.webmanifest': 'application/manifest+json',
  '.webp': 'image/webp',
  '.woff': 'font/woff',
  '.woff2': 'font/woff2',
};

/**
 * The files of a folder by their address. The list is made once, at the start: a path that is not
 * in it is not a file, whatever dots it holds. `/_astro/` holds the names with hashes.
 */
export function staticFiles(folder: string): StaticFiles {
  const files = new Map<string, StaticFile>();
  const hashes = new Set<string>();
  for (const file of filesBelow(folder)) {
    const type = types[extname(file)];
    if (type === undefined) continue;
    const path = `/${relative(folder, file).split(sep).join('/')}`;
    const digest = createHash('sha256').update(readFileSync(file)).digest('base64');
    if (/^text\/(css|javascript)/.test(type)) hashes.add(`'sha256-${digest}'`);
    files.set(path, {
      file,
      type,
      etag: `"${digest.slice(0, 22)}"`,
      hashed: path.startsWith('/_astro/'),
      encodings: new Set(
        (['br', 'gzip'] as const).filter((encoding) => exists(file + suffixOf[encoding])),
      ),
    });
  }
  return {
    hashes,
    async serve(path, request, response) {
      const found = files.get(path);
      if (!found) return false;
      await send(found, request, response);
      return true;
    },
  };
}

const suffixOf = { br: '.br', gzip: '.gz' } as const;

async function send(
  found: StaticFile,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const encoding = acceptedEncoding(request.headers['accept-encoding'], found.encodings);
  // One strong tag a representation: the compressed bytes are other bytes.
  const etag = encoding ? found.etag.replace(/"$/, `-${encoding}"`) : found.etag;
  response.setHeader('ETag', etag);
  response.setHeader(
    'Cache-Control',
    found.hashed ? 'public, max-age=31536000, immutable' : 'no-cache',
  );
  if (found.encodings.size > 0) response.setHeader('Vary', 'Accept-Encoding');
  if (request.headers['if-none-match']?.split(',').some((tag) => tag.trim() === etag)) {
    response.writeHead(304).end();
    return;
  }
  const bytes = await readFile(encoding ? found.file + suffixOf[encoding] : found.file);
  response.setHeader('Content-Type', found.type);
  if (encoding) response.setHeader('Content-Encoding', encoding);
  response.setHeader('Content-Length', bytes.length);
  response.writeHead(200).end(request.method === 'HEAD' ? undefined : bytes);
}

function filesBelow(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) return filesBelow(path);
    return entry.isFile() ? [path] : [];
  });
}

function exists(file: string): boolean {
  return statSync(file, { throwIfNoEntry: false }) !== undefined;
}
