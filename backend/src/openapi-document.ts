import { type INestApplication } from '@nestjs/common';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { Problem, ProblemField } from './common/dto/problem.js';

type Operation = NonNullable<OpenAPIObject['paths'][string]['get']>;

/** The contract between server and screens. Every operation may also answer with a refusal. */
export function apiDocument(app: INestApplication): OpenAPIObject {
  const config = new DocumentBuilder()
    .setTitle('Stageyard')
    .setVersion('1')
    .setDescription(
      'Multi-stage gearboxes: parts, briefs, option searches, trains and their bills of materials.',
    )
    .build();
  const document = SwaggerModule.createDocument(app, config, {
    extraModels: [Problem, ProblemField],
    operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}_${method}`,
  });
  for (const path of Object.values(document.paths)) {
    for (const operation of Object.values(path) as Operation[]) {
      operation.responses.default ??= {
        description: 'A refusal.',
        content: { 'application/json': { schema: { $ref: '#/components/schemas/Problem' } } },
      };
    }
  }
  return document;
}
