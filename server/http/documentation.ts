import { readFileSync } from 'node:fs';
import type { Express } from 'express';
import swaggerUi from 'swagger-ui-express';
import { projectFile } from '../project-file.ts';

/** The packaged layout with the bar on top brings a style block of its own, which the content security policy refuses. */
const OPTIONS = {
  swaggerUrl: '/openapi.yaml',
  customSiteTitle: 'Dextral API reference',
  customCssUrl: '/reference.css',
  customJs: '/theme.js',
  customfavIcon: '/mark.svg',
  swaggerOptions: { layout: 'BaseLayout', tryItOutEnabled: true, defaultModelsExpandDepth: 0, validatorUrl: null, syntaxHighlight: { activated: false } },
};

/** The contract as a file and as pages where a call can be tried with a key. */
export function mountDocumentation(app: Express): void {
  const contract = readFileSync(projectFile('openapi.yaml'), 'utf8');
  app.get('/openapi.yaml', (_request, response) => {
    response.type('application/yaml').set('Cache-Control', 'no-cache').send(contract);
  });

  // The packaged page has style blocks of its own, which the policy refuses too: reference.css says the same and more.
  const page = swaggerUi.generateHTML(undefined, OPTIONS).replaceAll(/<style>[\s\S]*?<\/style>/g, '').replaceAll(/ style="[^"]*"/g, '');
  app.get('/docs', (request, response, next) => {
    if (request.originalUrl.split('?')[0] === '/docs') return void response.redirect(308, '/docs/');
    next();
  });
  app.get('/docs/', (_request, response) => {
    response.type('text/html').send(page);
  });
  app.use('/docs', ...swaggerUi.serveFiles(undefined, OPTIONS));
}
