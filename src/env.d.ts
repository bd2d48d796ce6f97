/// <reference types="astro/client" />

declare namespace App {
  interface Locals {
    context: import('~/server/context').Context;
    /** Who asks; null without a session. */
    actor: import('~/domain/access/actor').Actor | null;
    requestId: string;
    /** From the socket and the configured count of trusted proxies, never from a header as sent. */
    clientAddress: string;
  }
}
