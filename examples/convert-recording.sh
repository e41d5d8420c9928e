#!/usr/bin/env bash
# Converts a recorded flight, quaternions of the inertial unit, to heading (0 to 360), pitch and roll in degrees for the
# ground display. curl, awk and the usual core utilities are all it takes.
#
#   examples/convert-recording.sh recording.csv converted.csv
#
# DEXTRAL_URL and DEXTRAL_KEY say where the service is and who calls; without them they are taken from the demo's
# demo.json (in DEXTRAL_DATA_DIR, or data/). Any answer but 200 ends the script with status 1, and is shown whole.
set -euo pipefail
export LC_ALL=C

[ $# -eq 2 ] || { echo "Usage: convert-recording.sh recording.csv converted.csv" >&2; exit 2; }
input=$1
output=$2
batch=5000 # A JSON call carries at most 10,000 attitudes.

# A preset by its id, and a convention with every facet stated: the two ways to say what numbers mean.
from='{"preset":"aircraft-quaternion"}'
to='{"representation":"euler","reference":"NED","body":"FRD","sequence":"ZYX","motion":"intrinsic","unit":"deg","order":[1,2,3],"signs":[1,1,1],"range":"positive"}'

if [ -z "${DEXTRAL_URL:-}" ] || [ -z "${DEXTRAL_KEY:-}" ]; then
  facts=${DEXTRAL_DATA_DIR:-data}/demo.json
  [ -r "$facts" ] || { echo "Set DEXTRAL_URL and DEXTRAL_KEY, or start the demo: there is no $facts." >&2; exit 2; }
  DEXTRAL_URL=$(grep -o '"url": *"[^"]*"' "$facts" | head -n 1 | cut -d '"' -f 4)
  DEXTRAL_KEY=$(grep -o '"secret": *"[^"]*"' "$facts" | head -n 1 | cut -d '"' -f 4)
fi

work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT

# The columns by their names, whatever else the recording holds: time_s, q_w, q_x, q_y, q_z.
awk -F, '{ sub(/\r$/, "") }
  NR == 1 { for (i = 1; i <= NF; i++) at[$i] = i
            split("time_s q_w q_x q_y q_z", names, " ")
            for (i = 1; i <= 5; i++) if (!(names[i] in at)) { print "The recording has no column " names[i] "." > "/dev/stderr"; exit 2 }
            next }
  { print $at["time_s"] "," $at["q_w"] "," $at["q_x"] "," $at["q_y"] "," $at["q_z"] }' "$input" > "$work/samples"
[ -s "$work/samples" ] || { echo "The recording has no samples." >&2; exit 2; }
split -a 5 -l "$batch" "$work/samples" "$work/part."
echo 'time_s,yaw_deg,pitch_deg,roll_deg' > "$work/converted"

for part in "$work"/part.*; do
  {
    printf '{"from":%s,"to":%s,"attitudes":[' "$from" "$to"
    awk -F, '{ printf "%s[%s,%s,%s,%s]", (NR > 1 ? "," : ""), $2, $3, $4, $5 }' "$part"
    printf ']}'
  } > "$work/request"
  status=$(curl -sS -o "$work/answer" -w '%{http_code}' "$DEXTRAL_URL/api/v1/convert" \
    -H "Authorization: Bearer $DEXTRAL_KEY" -H 'Content-Type: application/json' --data-binary "@$work/request")
  if [ "$status" != 200 ]; then
    echo "The service answered $status:" >&2
    cat "$work/answer" >&2
    exit 1
  fi
  # The member "attitudes" of the answer, [[yaw,pitch,roll],[…],…], one line for each.
  { sed -e 's/.*"attitudes":\[\[//' -e 's/\]\].*//' -e 's/\],\[/\n/g' "$work/answer"; echo; } | sed '/^$/d' > "$work/angles"
  [ "$(wc -l < "$work/angles")" = "$(wc -l < "$part")" ] || { echo "The answer has another count of attitudes than the request." >&2; exit 1; }
  cut -d, -f1 "$part" | paste -d, - "$work/angles" >> "$work/converted"
done

mv "$work/converted" "$output"
echo "$(($(wc -l < "$output") - 1)) attitudes converted to $output."
