/** [w, x, y, z] with Hamilton's product; as an attitude, v_ref = R(q) v_body with R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×]. */
export type Quaternion = [number, number, number, number];
