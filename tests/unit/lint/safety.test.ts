import { beforeAll, describe, expect, test } from 'vitest'

import { broken, FIRST_LOOK } from './broken'

beforeAll(() => broken('worker.ts', ''), FIRST_LOOK)

const QUERIES = 'lib/shades/another-query.ts'
const COMPONENT = 'components/shades/another.tsx'

const SQL_IMPORTS = `import { fn, literal } from 'sequelize'\nimport { sequelize } from '@/models'\n`
const query = (body: string) =>
  `${SQL_IMPORTS}export const asked = (given: string, list: string[]) => {\n${body}\n}\nvoid [fn, literal, sequelize]\n`

describe('SQL', () => {
  test.each([
    "return literal('version + 1')",
    'return literal(`count(*)::int`)',
    "return sequelize().query('SELECT $given', { bind: { given } })",
    "const OF = 'FROM shades'\nreturn sequelize().query(`SELECT 1 ${OF}`, { bind: { given } })",
    "const [A, B] = ['a' as const, given]\nvoid [A, B]\nreturn literal(given ? 'a' : 'b')",
    "return fn('lower', given)",
  ])('may be: %s', async (body) => {
    expect(await broken(QUERIES, query(body))).not.toContain('sql/fixed')
  })

  test.each([
    'return literal(`lower(${given})`)',
    "return literal('lower(' + given + ')')",
    'return literal(given)',
    'return literal(list.join())',
    'return literal(...list)',
    'const text = `SELECT ${given}`\nreturn sequelize().query(text)',
    "let text = 'SELECT 1'\ntext += given\nreturn sequelize().query(text)",
    'const [text] = list\nreturn sequelize().query(text!)',
    'return sequelize().query(`SELECT ${sequelize().escape(given)}`)',
    'return sequelize()?.query(`SELECT ${given}`)',
    "return sequelize()['query'](`SELECT ${given}`)",
    'return sequelize().query({ query: `SELECT ${given}`, values: [] })',
    'return list.map((sql) => literal(sql))',
    "return literal(given ? given : 'a')",
    'return fn(given)',
  ])('may not be: %s', async (body) => {
    expect(await broken(QUERIES, query(body))).toContain('sql/fixed')
  })

  test.each(['models/Another.ts', 'worker.ts', 'seeders/another.ts', 'migrations/another.ts'])(
    'is held to it in %s too',
    async (path) => {
      const text = `export const ask = (it: { query: (text: string) => void }, x: string) => it.query(\`DROP \${x}\`)\n`
      expect(await broken(path, text)).toContain('sql/fixed')
    },
  )
})

describe('what people see', () => {
  test('may be elements', async () => {
    const text = 'export const A = ({ text }: { text: string }) => <p title={text}>{text}</p>\n'
    expect(await broken(COMPONENT, text)).toEqual([])
  })

  test.each([
    'export const A = ({ __html }: { __html: string }) => <p dangerouslySetInnerHTML={{ __html }} />',
    `export const props = (__html: string) => ({ dangerouslySetInnerHTML: { __html } })`,
    `export const props = (__html: string) => ({ ['dangerouslySetInnerHTML']: { __html } })`,
    'export const A = ({ text }: { text: string }) => <iframe srcDoc={text} />',
    'export const put = (at: Element, text: string) => { at.innerHTML = text }',
    "export const put = (at: Element, text: string) => { at.insertAdjacentHTML('beforeend', text) }",
  ])('may not be: %s', async (text) => {
    expect(await broken(COMPONENT, `${text}\n`)).toContain('no-restricted-syntax')
  })
})

describe('code', () => {
  test.each([
    ['no-eval', 'export const run = (text: string): unknown => eval(text)'],
    ['no-eval', 'export const run = (text: string): unknown => globalThis.eval(text)'],
    ['no-new-func', 'export const run = (text: string): unknown => new Function(text)'],
    ['no-new-func', 'export const run = (text: string): unknown => Function(text)'],
    ['no-implied-eval', `export const later = () => setTimeout('run()', 1)`],
    ['no-script-url', `export const away = 'javascript:void 0'`],
  ])('is never made of text (%s): %s', async (rule, text) => {
    for (const path of [QUERIES, COMPONENT, 'worker.ts']) {
      expect(await broken(path, `${text}\n`)).toContain(rule)
    }
  })
})
