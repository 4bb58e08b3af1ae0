import type { RequestHandler } from 'express';
import helmet from 'helmet';

interface SecurityOptions {
  /** Sources for the inline scripts of the page that is served. */
  inlineScripts: string[];
  isSecure: boolean;
}

const UNUSED_FEATURES = 'geolocation=(), microphone=(), payment=(), usb=(), browsing-topics=()';

export function securityHeaders({ inlineScripts, isSecure }: SecurityOptions): RequestHandler[] {
  return [
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          'default-src': ["'self'"],
          'script-src': ["'self'", ...inlineScripts],
          'script-src-attr': ["'none'"],
          // React Native for the web writes its style sheet into the page.
          'style-src': ["'self'", "'unsafe-inline'"],
          'img-src': ["'self'", 'data:', 'blob:'],
          'font-src': ["'self'"],
          'connect-src': ["'self'"],
          'worker-src': ["'self'"],
          'manifest-src': ["'self'"],
          'object-src': ["'none'"],
          'base-uri': ["'none'"],
          'form-action': ["'self'"],
          'frame-ancestors': ["'none'"],
          ...(isSecure ? { 'upgrade-insecure-requests': [] } : {}),
        },
      },
      strictTransportSecurity: isSecure,
      xFrameOptions: { action: 'deny' },
    }),
    (_req, res, next) => {
      res.set('Permissions-Policy', UNUSED_FEATURES);
      next();
    },
  ];
}
