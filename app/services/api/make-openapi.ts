import { z } from "zod";
import { ALL_API_ROUTES } from "~/schemas/api/all-api-routes";
import { problemAnswer } from "~/schemas/api/answers/problem";
import type { ApiRoute } from "~/schemas/api/api-route";
import { describeOperation } from "./describe-operation";
import { schemaName } from "./schema-name";

type Schemas = Record<string, unknown>;

const place = (id: string) => `#/components/schemas/${id}`;

/**
 * The OpenAPI 3.1 document of the JSON routes, made from the schemas by which they check what comes in and by which
 * the tests check what goes out.
 */
export function makeOpenapi(routes: readonly ApiRoute[] = ALL_API_ROUTES): Record<string, unknown> {
  const bodies: [string, z.ZodType][] = [];
  const answers: [string, z.ZodType][] = [["Problem", problemAnswer]];
  const paths: Record<string, Record<string, unknown>> = {};
  for (const route of routes) {
    const { id, body, answer } = route;
    if (body && "schema" in body) bodies.push([schemaName(id, "Body"), body.schema]);
    if ("schema" in answer) answers.push([schemaName(id, "Answer"), answer.schema]);
    const path = route.path.replace(/:(\w+)/g, "{$1}");
    paths[path] = { ...paths[path], [route.method]: describeOperation(route) };
  }
  return {
    openapi: "3.1.0",
    info: {
      title: "Cotterpin",
      version: "1",
      description:
        "The stockroom of a firm that makes kits. Quantities are decimal text, dates year-month-day. Costs are null for people who may not see them.",
    },
    paths,
    components: {
      schemas: { ...toSchemas(bodies, "input"), ...toSchemas(answers, "output") },
      securitySchemes: {
        token: { type: "http", scheme: "bearer" },
        session: { type: "apiKey", in: "cookie", name: "cotterpin_session" },
      },
    },
    security: [{ token: [] }, { session: [] }],
  };
}

/** JSON schemas by name. Each is made on its own, so one zod schema may stand under two names. */
function toSchemas(named: [string, z.ZodType][], io: "input" | "output"): Schemas {
  return Object.fromEntries(
    named.map(([id, schema]) => {
      const registry = z.registry<{ id: string }>();
      registry.add(schema, { id });
      const { schemas } = z.toJSONSchema(registry, { io, uri: place, unrepresentable: "any" });
      const { $id: _, $schema: __, ...plain } = schemas[id] as Schemas;
      return [id, plain];
    }),
  );
}
