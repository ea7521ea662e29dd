'use client'

import { useRouter } from 'next/navigation'

import { Button } from '@/components/ui/button'

import { shadesHref, type LinePlace, type ShadesActions } from './shades-actions'
import { useDeleteShades } from './use-delete-shades'

/** Deletes the shade whose page this is, and goes back to the others. */
export function DeleteShadeButton({
  place,
  shadeId,
  actions,
}: {
  place: LinePlace
  shadeId: string
  actions: Pick<ShadesActions, 'remove' | 'restore'>
}) {
  const router = useRouter()
  const { remove, pending, dialog } = useDeleteShades({
    place,
    actions,
    onDeleted: () => {
      router.push(shadesHref(place) as never)
      router.refresh()
    },
  })
  return (
    <>
      {dialog}
      <Button
        variant="danger"
        pending={pending}
        pendingLabel="Deleting shade…"
        onClick={() => void remove([shadeId])}
      >
        Delete shade
      </Button>
    </>
  )
}
