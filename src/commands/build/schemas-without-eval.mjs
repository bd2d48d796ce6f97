/**
 * Astro integration: before any island comes alive, tells zod to interpret its schemas. Left to
 * itself zod tries whether it may compile them with `new Function`; the content policy refuses
 * that, and each page view would report a violation of the policy.
 */
export function schemasWithoutEval() {
  return {
    name: 'dipwright-schemas-without-eval',
    hooks: {
      'astro:config:setup': ({ injectScript }) => {
        injectScript(
          'before-hydration',
          "import { config } from 'zod/v4/core';\nconfig({ jitless: true });",
        );
      },
    },
  };
}
