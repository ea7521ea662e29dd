import type { FieldValues, Resolver } from 'react-hook-form'
import type { z } from 'zod'

/**
 * A form's resolver whose schema, and zod with it, is loaded when the form is first checked, not
 * with the page. When it cannot be loaded the values go on as they are: the action parses them by
 * the same schema, or says that the server is out of reach.
 */
export const schemaResolver =
  <Values extends FieldValues, Output = Values>(
    load: () => Promise<z.ZodType>,
  ): Resolver<Values, unknown, Output> =>
  async (values, ...terms) => {
    const loaded = await Promise.all([
      import('@hookform/resolvers/zod'),
      import('zod').then(({ config }) => {
        // zod writes faster checks by eval, which our pages do not let anything do.
        config({ jitless: true })
        return load()
      }),
    ]).catch(() => null)
    if (!loaded) return { values: values as never, errors: {} }
    const [{ zodResolver }, schema] = loaded
    return zodResolver(schema as z.ZodType<Output, Values>)(values, ...terms)
  }
