import { readFileSync } from 'node:fs';
import type { Express } from 'express';
import swaggerUi from 'swagger-ui-express';
import { projectFile } from '../project-file.ts';

const PAGE_STYLES = `
html { box-sizing: border-box; overflow-y: scroll; }
*, *::before, *::after { box-sizing: inherit; }
body { margin: 0; background: #f7f3e8; }
.swagger-ui .topbar { display: none; }
body > svg { position: absolute; width: 0; height: 0; }
`;

/** The contract as a file and as pages where a call can be tried with a key. */
export function mountDocumentation(app: Express): void {
  const contract = readFileSync(projectFile('openapi.yaml'), 'utf8');
  app.get('/openapi.yaml', (_request, response) => {
    response.type('application/yaml').set('Cache-Control', 'no-cache').send(contract);
  });

  // The packaged page has style blocks of its own, which the content security policy refuses: they are taken out
  // and served as a file.
  const page = swaggerUi
    .generateHTML(undefined, { swaggerUrl: '/openapi.yaml', customSiteTitle: 'Dextral API reference', customCssUrl: '/docs/page.css', swaggerOptions: { tryItOutEnabled: true, defaultModelsExpandDepth: 0, validatorUrl: null, syntaxHighlight: { activated: false } } })
    .replaceAll(/<style>[\s\S]*?<\/style>/g, '')
    .replaceAll(/ style="[^"]*"/g, '');
  app.get('/docs/page.css', (_request, response) => {
    response.type('text/css').send(PAGE_STYLES);
  });
  app.get('/docs', (request, response, next) => {
    if (request.originalUrl.split('?')[0] === '/docs') return void response.redirect(308, '/docs/');
    next();
  });
  app.get('/docs/', (_request, response) => {
    response.type('text/html').send(page);
  });
  app.use('/docs', ...swaggerUi.serveFiles(undefined, { swaggerUrl: '/openapi.yaml', swaggerOptions: { tryItOutEnabled: true, defaultModelsExpandDepth: 0, validatorUrl: null, syntaxHighlight: { activated: false } } }));
}
