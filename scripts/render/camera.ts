/** A level view camera looking along +z: lengths in metres, y up. */
export interface Camera {
  x: number
  y: number
  z: number
  /** focal length in picture widths */
  focal: number
  /** height of the horizon, in picture heights from the top */
  horizon: number
}

/** A direction or a place: x right, y up, z ahead. */
export interface Vector {
  x: number
  y: number
  z: number
}

/** The vector at length 1. */
export function unit({ x, y, z }: Vector): Vector {
  const length = Math.hypot(x, y, z)
  return { x: x / length, y: y / length, z: z / length }
}

/** Where a place falls on a picture `width`×`height`, in pixels; `scale` is pixels to the metre there. */
export function project(camera: Camera, width: number, height: number, place: Vector) {
  const depth = place.z - camera.z
  const scale = (width * camera.focal) / depth
  return {
    x: width / 2 + (place.x - camera.x) * scale,
    y: height * camera.horizon - (place.y - camera.y) * scale,
    scale,
    depth,
  }
}
