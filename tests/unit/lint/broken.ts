import { ESLint } from 'eslint'
import typescript from 'typescript-eslint'

let eslint: ESLint | undefined

/** How long the first look may take, which loads the rules, in milliseconds. */
export const FIRST_LOOK = 60_000

/** The rules that a file with this text, at this place, breaks. */
export async function broken(path: string, text: string): Promise<string[]> {
  // The snippets are no files of the project, so the rules that ask for types are left out.
  eslint ??= new ESLint({ overrideConfig: [typescript.configs.disableTypeChecked] as never })
  const [result] = await eslint.lintText(text, { filePath: path })
  const fatal = result!.messages.find(({ fatal }) => fatal)
  if (fatal) throw new Error(fatal.message)
  return result!.messages.map(({ ruleId }) => ruleId ?? '')
}
