/**
 * The one Content-Security-Policy: everything comes from the origin, nothing inline, nothing leaves.
 * It stands in the page's meta tag, so that any static host enforces it, and in the headers of the preview server,
 * because a meta tag does not govern the service worker's own script.
 */
import type { Plugin } from 'vite';

export const contentSecurityPolicy = [
  "default-src 'self'",
  "connect-src 'self'",
  "script-src 'self'",
  "style-src 'self'",
  "img-src 'self' data: blob:",
  "worker-src 'self'",
  "manifest-src 'self'",
  "object-src 'none'",
  "base-uri 'none'",
  "form-action 'none'",
].join('; ');

/** Puts the policy at the top of the built page. The development server injects inline styles, so it goes without. */
export function contentSecurityPolicyTag(): Plugin {
  return {
    name: 'driftbook-content-security-policy',
    apply: 'build',
    transformIndexHtml: () => [
      {
        tag: 'meta',
        attrs: { 'http-equiv': 'Content-Security-Policy', content: contentSecurityPolicy },
        injectTo: 'head-prepend',
      },
    ],
  };
}
