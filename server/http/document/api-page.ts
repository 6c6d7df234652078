import type { ApiDocument, JsonSchema, Operation } from '#server/http/document/api-document'

const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

const escape = (text: string): string => text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign)

const schemaBlock = (title: string, schema: JsonSchema | undefined): string =>
  schema
    ? `<details><summary>${title}</summary><pre>${escape(JSON.stringify(schema, null, 2))}</pre></details>`
    : ''

function parameterTable({ parameters }: Operation): string {
  if (parameters.length === 0) return ''
  const rows = parameters.map(
    (parameter) =>
      `<tr><th scope="row"><code>${escape(parameter.name)}</code></th><td>${parameter.in}</td>` +
      `<td>${parameter.required ? 'required' : 'optional'}</td>` +
      `<td><code>${escape(JSON.stringify(parameter.schema))}</code></td></tr>`,
  )
  return `<table><thead><tr><th>Name</th><th>In</th><th></th><th>Form</th></tr></thead><tbody>${rows.join('')}</tbody></table>`
}

function section(path: string, method: string, operation: Operation): string {
  const body = operation.requestBody?.content?.['application/json']?.schema
  const answers = Object.entries(operation.responses).filter(([status]) => status !== 'default')
  return [
    `<section id="${escape(operation.operationId)}">`,
    `<h3><span class="method">${method.toUpperCase()}</span> <code>${escape(path)}</code></h3>`,
    `<p>${escape(operation.summary)} ${escape(operation.description)}</p>`,
    parameterTable(operation),
    schemaBlock('Body', body),
    ...answers.flatMap(([status, { content = {} }]) =>
      Object.entries(content).map(([type, { schema }]) =>
        type === 'application/json'
          ? schemaBlock(`Answer ${status}`, schema)
          : `<p>Answer ${status}: a file, <code>${escape(type)}</code>.</p>`,
      ),
    ),
    '</section>',
  ].join('\n')
}

/** The document for people: plain HTML without script; `styleSheet` is the address of its CSS. */
export function createApiPage(document: ApiDocument, styleSheet: string): string {
  const operations = Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
  )
  const tags = [...new Set(operations.flatMap(({ operation }) => operation.tags))]
  const groups = tags.map((tag) => {
    const members = operations.filter(({ operation }) => operation.tags.includes(tag))
    const sections = members.map(({ path, method, operation }) => section(path, method, operation))
    return `<h2>${escape(tag)}</h2>\n${sections.join('\n')}`
  })
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escape(document.info.title)} API</title>
<link rel="stylesheet" href="${escape(styleSheet)}">
</head>
<body>
<main>
<h1>${escape(document.info.title)} API</h1>
<p>${escape(document.info.description)}</p>
<p>For programs: <a href="openapi.json">openapi.json</a> (OpenAPI ${document.openapi}).</p>
${groups.join('\n')}
</main>
</body>
</html>
`
}

export const API_PAGE_STYLE = `
:root { color-scheme: light dark; font: 16px/1.5 system-ui, sans-serif; }
main { max-width: 60rem; margin: 0 auto; padding: 1.5rem; }
h2 { margin-top: 3rem; border-bottom: 2px solid; text-transform: capitalize; }
h3 { margin-top: 2rem; }
.method { display: inline-block; min-width: 4.5rem; }
code, pre { font: 0.875rem/1.4 ui-monospace, monospace; }
pre { overflow-x: auto; padding: 0.75rem; border: 1px solid; }
table { border-collapse: collapse; width: 100%; }
th, td { padding: 0.25rem 0.5rem; border: 1px solid; text-align: left; overflow-wrap: anywhere; }
summary { cursor: pointer; padding: 0.5rem 0; }
`
