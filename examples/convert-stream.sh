#!/usr/bin/env bash
# Converts a recording of any length in one call: its quaternions go up as CSV while the angles come down, with curl and awk.
# usage: examples/convert-stream.sh recording.csv converted.csv
set -euo pipefail

recording=${1:?usage: convert-stream.sh recording.csv converted.csv}
converted=${2:?usage: convert-stream.sh recording.csv converted.csv}
if [ -z "${DEXTRAL_URL:-}" ] || [ -z "${DEXTRAL_KEY:-}" ]; then
  facts="${DEXTRAL_DATA_DIR:-data}/demo.json"
  [ -f "$facts" ] || { echo "Set DEXTRAL_URL and DEXTRAL_KEY, or start the demo: there is no $facts." >&2; exit 1; }
  DEXTRAL_URL=$(grep -o '"url": *"[^"]*"' "$facts" | head -n 1 | cut -d '"' -f 4)
  DEXTRAL_KEY=$(grep -o '"secret": *"[^"]*"' "$facts" | head -n 1 | cut -d '"' -f 4)
fi

work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT

# The columns by their names, wherever they stand.
awk -F, '
  NR == 1 { for (i = 1; i <= NF; i++) at[$i] = i
            if (!("q_w" in at && "q_x" in at && "q_y" in at && "q_z" in at && "time_s" in at)) { print "The recording needs the columns time_s, q_w, q_x, q_y, q_z." > "/dev/stderr"; exit 1 }
            next }
  { print $at["time_s"] > times; print $at["q_w"] "," $at["q_x"] "," $at["q_y"] "," $at["q_z"] }
' times="$work/times" "$recording" > "$work/quaternions"

# -T sends while it reads, which a stream needs; --fail-with-body shows the problem document of a refusal.
curl --silent --show-error --fail-with-body -X POST -T - \
  "$DEXTRAL_URL/api/v1/convert?from=aircraft-quaternion&to=aircraft-euler-deg" \
  -H "Authorization: Bearer $DEXTRAL_KEY" -H 'Content-Type: text/csv' -H 'Accept: text/csv' \
  < "$work/quaternions" > "$work/angles" || { cat "$work/angles" >&2; echo >&2; exit 1; }

# A row refused after the answer had begun stands in its last line.
if tail -n 1 "$work/angles" | grep '^problem,' >&2; then exit 1; fi

{ echo time_s,yaw_deg,pitch_deg,roll_deg; paste -d, "$work/times" "$work/angles"; } > "$work/converted"
mv "$work/converted" "$converted"
echo "$(wc -l < "$work/angles") attitudes converted"
