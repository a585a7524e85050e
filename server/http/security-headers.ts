import helmet from 'helmet';

/**
 * Nothing from elsewhere, no inline scripts, no frames. Inline styles stay allowed: Angular puts the styles
 * of components and of Angular Material into <style> elements while it runs.
 */
export function securityHeaders() {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'", 'data:'],
        connectSrc: ["'self'"],
        workerSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    xFrameOptions: { action: 'deny' },
    // the workshop's other addresses may still be plain HTTP: speak only for this one
    strictTransportSecurity: { includeSubDomains: false },
    referrerPolicy: { policy: 'same-origin' },
  });
}
