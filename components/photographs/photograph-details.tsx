'use client'

import dynamic from 'next/dynamic'

import type { PhotographDetailsFormProps } from './photograph-details-form'
import { PhotographFacts } from './photograph-facts'

// A page of photographs answers before what drives its form is there.
const PhotographDetailsForm = dynamic(() =>
  import('./photograph-details-form').then((it) => it.PhotographDetailsForm),
)

/** What is said about a photograph: a form for those who may change it, facts for the others. */
export function PhotographDetails(props: PhotographDetailsFormProps) {
  return props.photograph.canEdit ? (
    <PhotographDetailsForm {...props} />
  ) : (
    <PhotographFacts photograph={props.photograph} />
  )
}
