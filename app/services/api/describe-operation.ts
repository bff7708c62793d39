import { z } from "zod";
import type { ApiRoute } from "~/schemas/api/api-route";
import { schemaName } from "./schema-name";

const TITLES: Record<number, string> = {
  400: "The request could not be read",
  401: "Sign-in needed",
  403: "Not among the asker's rights",
  404: "Not found",
  409: "In conflict with what is there",
  413: "Too much at once",
  415: "Not a type this address takes",
  422: "The content is not valid; errors[] names line and column, or field",
  503: "Not able to work just now",
};

/** One operation of the document: what it takes, what it answers and how it refuses. */
export function describeOperation(route: ApiRoute): Record<string, unknown> {
  return {
    operationId: route.id,
    summary: route.summary,
    parameters: [
      ...pathParameters(route),
      ...parameters(route.query, "query"),
      ...parameters(route.headers, "header"),
    ],
    ...(route.body && { requestBody: describeBody(route) }),
    responses: { ...describeAnswers(route), ...describeProblems(route) },
    ...(route.isPublic && { security: [] }),
  };
}

function pathParameters({ path, params }: ApiRoute) {
  const named = [...path.matchAll(/:(\w+)/g)].map(([, name]) => name);
  const text = z.object(Object.fromEntries(named.map((name) => [name, z.string()])));
  return parameters(params ?? text, "path");
}

function parameters(schema: z.ZodObject | undefined, where: "path" | "query" | "header") {
  if (!schema) return [];
  const { properties, required } = z.toJSONSchema(schema, { io: "input", unrepresentable: "any" });
  return Object.entries(properties ?? {}).map(([name, one]) => ({
    name,
    in: where,
    required: required?.includes(name) ?? false,
    schema: one,
  }));
}

function describeBody({ id, body }: ApiRoute) {
  if (!body) return undefined;
  const schema =
    "schema" in body
      ? { $ref: `#/components/schemas/${schemaName(id, "Body")}` }
      : { type: "string", description: "UTF-8 with a header line, columns in any order" };
  return { required: true, content: { [body.type]: { schema } } };
}

function describeAnswers({ id, answer }: ApiRoute) {
  if (!("schema" in answer)) {
    const schema = answer.type === "text/csv" ? { type: "string" } : {};
    return { 200: { description: "The file", content: { [answer.type]: { schema } } } };
  }
  const schema = { $ref: `#/components/schemas/${schemaName(id, "Answer")}` };
  const statuses = [answer.status ?? 200, ...(answer.alsoWith ?? [])];
  return Object.fromEntries(
    statuses.map((status) => [
      status,
      { description: TITLES[status] ?? "The answer", content: { [answer.type]: { schema } } },
    ]),
  );
}

function describeProblems({ isPublic, body, problems = [] }: ApiRoute) {
  const statuses = new Set([
    ...(isPublic ? [] : [401, 403]),
    ...(body ? [400, 413, 415, 422] : []),
    ...problems,
    ...(isPublic ? [] : [503]),
  ]);
  const content = { "application/problem+json": { schema: { $ref: "#/components/schemas/Problem" } } };
  return Object.fromEntries(
    [...statuses].map((status) => [status, { description: TITLES[status], content }]),
  );
}
