import { literal } from 'sequelize'

/**
 * Which of a shade's ideas stands for it: what is approved, else what is in review, else what was
 * drafted or returned last; what is put by stands for nothing.
 */
const OF_LEADING = `FROM name_ideas i
  WHERE i.shade_id = "Shade".id AND i.brand_id = "Shade".brand_id
    AND i.deleted_at IS NULL AND i.state <> 'put-by'
  ORDER BY array_position(ARRAY['approved', 'in-review'], i.state), i.state_since DESC, i.id
  LIMIT 1`

/** In a query of shades: the id of the leading idea. */
export const LEADING_ID = literal(`(SELECT i.id ${OF_LEADING})`)
/** In a query of shades: what the leading idea says. */
export const LEADING_TEXT = literal(`(SELECT i.text ${OF_LEADING})`)
/** In a query of shades: one of LISTED_STATES. */
export const LISTED_STATE = literal(`coalesce((SELECT i.state ${OF_LEADING}), 'none')`)
