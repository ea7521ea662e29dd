import { ImageIcon } from 'lucide-react'

import { cn } from '@/components/ui/cn'
import type { PhotographView, PictureSource } from '@/lib/photographs/present'

/** Props of {@link PhotographPicture}. */
export interface PhotographPictureProps {
  photograph: Pick<
    PhotographView,
    'title' | 'altText' | 'width' | 'height' | 'sources' | 'fallbackSrc'
  >
  /** How wide the picture is drawn, as the `sizes` attribute says it. */
  sizes: string
  /** `width`: as wide as its place, as high as its ratio; `frame`: whole within its place's box. */
  fit?: 'width' | 'frame'
  className?: string
  /** The picture the page is about: fetched first. */
  priority?: boolean
}

const srcSetOf = (sources: readonly PictureSource[]): string =>
  sources.map(({ src, width }) => `${src} ${width}w`).join(', ')

/**
 * A photograph from our own copies, its place kept before it arrives; an undyed card while there
 * are no copies. Without alt text the title is read out, so that it is never nameless.
 */
export function PhotographPicture({
  photograph,
  sizes,
  fit = 'width',
  className,
  priority = false,
}: PhotographPictureProps) {
  const { title, altText, width, height, sources, fallbackSrc } = photograph
  if (!fallbackSrc) {
    return (
      <div
        role="img"
        aria-label={`${title}: no picture yet`}
        style={{ aspectRatio: fit === 'width' ? `${width ?? 3} / ${height ?? 2}` : undefined }}
        className={cn(
          'flex items-center justify-center bg-wash text-ink-faint',
          fit === 'frame' && 'size-full',
          className,
        )}
      >
        <ImageIcon aria-hidden="true" className="size-7" strokeWidth={1.25} />
      </div>
    )
  }
  return (
    <picture className={cn('block', fit === 'frame' && 'size-full', className)}>
      {sources.avif.length > 0 ? (
        <source type="image/avif" srcSet={srcSetOf(sources.avif)} sizes={sizes} />
      ) : null}
      <source type="image/webp" srcSet={srcSetOf(sources.webp)} sizes={sizes} />
      <img
        src={fallbackSrc}
        alt={altText || title}
        width={width ?? undefined}
        height={height ?? undefined}
        loading={priority ? 'eager' : 'lazy'}
        fetchPriority={priority ? 'high' : undefined}
        decoding="async"
        className={fit === 'frame' ? 'size-full object-contain' : 'h-auto w-full bg-wash'}
      />
    </picture>
  )
}
