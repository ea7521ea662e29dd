import { NameIdea, NameMove, type Line, type Shade } from '@/models'

type Values = Partial<
  Pick<
    NameIdea,
    'text' | 'note' | 'state' | 'round' | 'authorId' | 'wordedById' | 'findings' | 'wordingReason'
  >
>

/**
 * An idea for a name, with whatever matters to the test. An approved one gives its shade the name,
 * as the command does.
 */
export async function makeIdea(
  line: Line,
  shade: Shade | null,
  { text = 'Thyme Will Tell', authorId = null, ...values }: Values = {},
): Promise<NameIdea> {
  const inLine = { brandId: line.brandId, lineId: line.id }
  const state = values.state ?? 'draft'
  const round = values.round ?? (state === 'draft' || state === 'put-by' ? 0 : 1)
  const idea = await NameIdea.create({
    ...inLine,
    shadeId: shade?.id ?? null,
    text,
    authorId,
    wordedById: authorId,
    ...values,
    state,
    round,
  })
  await NameMove.create({
    ...inLine,
    ideaId: idea.id,
    move: 'add',
    toState: state,
    text,
    shadeId: idea.shadeId,
    round,
    personId: authorId,
  })
  if (shade && state === 'approved') await shade.update({ name: text })
  return idea
}
