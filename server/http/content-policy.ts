import type { HelmetOptions } from 'helmet';

/** What a page may load: only what this server ships. Libraries set styles on elements, none inject scripts. */
export function contentPolicy(settings: { secureCookies: boolean; development: boolean }): Readonly<HelmetOptions> {
  return {
    contentSecurityPolicy: settings.development
      ? false
      : {
          useDefaults: false,
          directives: {
            defaultSrc: ["'self'"],
            scriptSrc: ["'self'"],
            styleSrc: ["'self'"],
            styleSrcElem: ["'self'"],
            styleSrcAttr: ["'unsafe-inline'"],
            imgSrc: ["'self'", 'blob:', 'data:'],
            fontSrc: ["'self'"],
            connectSrc: ["'self'"],
            objectSrc: ["'none'"],
            baseUri: ["'none'"],
            frameAncestors: ["'none'"],
            formAction: ["'self'"],
          },
        },
    strictTransportSecurity: settings.secureCookies,
    crossOriginEmbedderPolicy: false,
  };
}
