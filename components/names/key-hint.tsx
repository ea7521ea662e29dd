import { Kbd } from '@/components/ui/kbd'

/** Keys that do not say their own name. */
export const KEY_FACES: Record<string, string> = { ArrowRight: '→', ArrowLeft: '←' }

/** The key of a button, for the eye: the button says it by aria-keyshortcuts. */
export function KeyHint({ of }: { of: string }) {
  return (
    <span aria-hidden="true" className="pointer-coarse:hidden">
      <Kbd>{KEY_FACES[of] ?? of.toUpperCase()}</Kbd>
    </span>
  )
}
