import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { ProblemBody } from './common/problem';

const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;

/** The contract that the web's types are made from. */
export function createOpenApi(app: INestApplication): OpenAPIObject {
  const description = new DocumentBuilder().setTitle('Settlewright').setVersion('1').addBearerAuth().build();
  const document = SwaggerModule.createDocument(app, description, {
    extraModels: [ProblemBody],
    operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}_${method}`,
  });
  for (const path of Object.values(document.paths)) {
    for (const method of METHODS) {
      const operation = path[method];
      if (!operation) continue;
      operation.responses.default = {
        description: 'what went wrong (RFC 9457)',
        content: {
          'application/problem+json': { schema: { $ref: '#/components/schemas/ProblemBody' } },
        },
      };
    }
  }
  return document;
}

export function serveOpenApi(app: INestApplication): void {
  let made: string | undefined;
  app
    .getHttpAdapter()
    .get('/api/openapi.json', (_request, response: { type(t: string): { send(b: string): void } }) => {
      made ??= JSON.stringify(createOpenApi(app));
      response.type('application/json').send(made);
    });
}
