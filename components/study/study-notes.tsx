import { Note } from '@/components/layout/note'
import { ScreenCaution } from '@/components/layout/screen-caution'
import { LEAST_GAP } from '@/lib/color/gaps'

/** What a range study can say and what it cannot. */
export function StudyNotes({ isMixed }: { isMixed: boolean }) {
  return (
    <>
      <Note title="Before you judge">
        <ScreenCaution />
        {isMixed ? (
          <p>
            Some shades were read with the other observer. Between those, differences are a guide
            only.
          </p>
        ) : null}
      </Note>
      <Note title="How others see">
        <p>
          Milder forms of colour-vision deficiency lose less than the model, and no two people see
          the same. Where it matters, ask somebody.
        </p>
        <p className="text-sm text-ink-faint">
          Protan and deutan after Machado 2009, tritan after Brettel 1997.
        </p>
      </Note>
      <Note title="What counts as a gap">
        <p>
          The line spans all that lies between its shades. A gap is the middle of the largest ball
          in there with no shade in it, ΔE00 {LEAST_GAP} or more from each; every next one counts
          those before it as filled.
        </p>
        <p className="text-sm text-ink-faint">
          Worked out in DIN99o (DIN 6176). What your dyes and this fibre reach, only a lab dip
          tells.
        </p>
      </Note>
    </>
  )
}
