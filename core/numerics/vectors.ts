/** Vectors of three components and the rotations that orbits need. */

export type Vec3 = readonly [number, number, number];

export function dot(a: Vec3, b: Vec3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

export function cross(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

export function norm(a: Vec3): number {
  return Math.hypot(a[0], a[1], a[2]);
}

export function scale(a: Vec3, factor: number): Vec3 {
  return [a[0] * factor, a[1] * factor, a[2] * factor];
}

export function add(a: Vec3, b: Vec3): Vec3 {
  return [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
}

/** `a·x + b·y`, the combination that places a point in a plane. */
export function combine(a: number, x: Vec3, b: number, y: Vec3): Vec3 {
  return [a * x[0] + b * y[0], a * x[1] + b * y[1], a * x[2] + b * y[2]];
}

/** Turns a vector about the z axis by an angle in rad, counter-clockwise seen from +z. */
export function rotateAboutZ(a: Vec3, angleRad: number): Vec3 {
  const c = Math.cos(angleRad);
  const s = Math.sin(angleRad);
  return [c * a[0] - s * a[1], s * a[0] + c * a[1], a[2]];
}

/** Turns a vector by a rotation vector (axis times angle in rad), Rodrigues' formula. */
export function rotateBy(a: Vec3, rotation: Vec3): Vec3 {
  const angle = norm(rotation);
  // Below this the second-order term is under rounding, and 1/angle would overflow for the smallest.
  if (angle < 1e-9) return add(a, cross(rotation, a));
  const axis = scale(rotation, 1 / angle);
  const along = dot(axis, a) * (1 - Math.cos(angle));
  return add(combine(Math.cos(angle), a, Math.sin(angle), cross(axis, a)), scale(axis, along));
}
