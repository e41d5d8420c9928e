#!/usr/bin/env bash
# Converts a recorded flight from quaternions to yaw, pitch and roll in degrees, in batches, with curl and awk.
#
#   examples/convert-recording.sh recording.csv converted.csv
#
# DEXTRAL_URL and DEXTRAL_KEY say where the service is and who calls; without them they are taken from the demo's
# demo.json (in DEXTRAL_DATA_DIR, or data/). Any answer but 200 stops the script and is shown.
set -euo pipefail

[ $# -eq 2 ] || { echo "Usage: convert-recording.sh recording.csv converted.csv" >&2; exit 2; }
input=$1
output=$2
batch=5000 # A JSON call carries at most 10,000 attitudes.

if [ -z "${DEXTRAL_URL:-}" ] || [ -z "${DEXTRAL_KEY:-}" ]; then
  facts=${DEXTRAL_DATA_DIR:-data}/demo.json
  DEXTRAL_URL=$(sed -n 's/.*"url": "\(.*\)".*/\1/p' "$facts")
  DEXTRAL_KEY=$(sed -n 's/.*"secret": "\(.*\)".*/\1/p' "$facts" | head -n 1)
fi

work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
tail -n +2 "$input" | split -l "$batch" - "$work/part."
echo 'time_s,yaw_deg,pitch_deg,roll_deg' > "$work/converted"

for part in "$work"/part.*; do
  # Columns 2 to 5 are q_w, q_x, q_y, q_z.
  awk -F, 'BEGIN { printf "{\"from\":{\"preset\":\"aircraft-quaternion\"},\"to\":{\"preset\":\"aircraft-euler-deg\"},\"attitudes\":[" }
    { printf "%s[%s,%s,%s,%s]", (NR > 1 ? "," : ""), $2, $3, $4, $5 }
    END { print "]}" }' "$part" > "$work/request"
  status=$(curl -sS -o "$work/answer" -w '%{http_code}' "$DEXTRAL_URL/api/v1/convert" \
    -H "Authorization: Bearer $DEXTRAL_KEY" -H 'Content-Type: application/json' --data-binary "@$work/request")
  if [ "$status" != 200 ]; then
    echo "The service answered $status:" >&2
    cat "$work/answer" >&2
    exit 1
  fi
  # The answer's first member is "attitudes": one array of three numbers a row.
  sed -e 's/^{"attitudes":\[\[//' -e 's/\]\],"from".*//' -e 's/\],\[/\n/g' "$work/answer" > "$work/angles"
  echo >> "$work/angles"
  cut -d, -f1 "$part" | paste -d, - <(sed '/^$/d' "$work/angles") >> "$work/converted"
done

mv "$work/converted" "$output"
echo "$(($(wc -l < "$output") - 1)) attitudes converted to $output."
