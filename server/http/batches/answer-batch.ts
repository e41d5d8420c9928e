import { JSON_BODY_BYTES } from '#shared/api/limits.ts';
import { convertAttitudes } from '#server/domain/attitude/convert.ts';
import { meterWarnings } from '#server/domain/attitude/meter-warnings.ts';
import type { Services } from '#server/services.ts';
import type { Call } from '../call.ts';
import { record } from '../record.ts';
import { wholeBody } from './body.ts';
import { contentTypeOf, type Exchange } from './negotiate.ts';
import { readQuery, refuseStatedTwice } from './query.ts';

/** Answers a call with JSON on one side at least: held whole, all or nothing, in a thread of its own, recorded before it leaves. */
export async function answerBatch(services: Services, call: Call, route: string, { input, output }: Exchange): Promise<void> {
  const { request, response, meter } = call;
  if (!input) refuseStatedTwice(request.query);
  const rows = input ? { format: input, ...readQuery(request) } : null;
  const body = await wholeBody(request, JSON_BODY_BYTES);
  // A copy, since the bytes themselves move to the other thread.
  call.body = Buffer.from(body);
  call.bodyMayBeKept = true;
  const { attitudesPerCall: most } = services.limits.of(call.caller!);
  const converted = await services.batches.convert({ body, rows, output, most });
  let bytes: Uint8Array;
  if ('crossCheck' in converted) {
    bytes = Buffer.from(JSON.stringify(await convertAttitudes(services, converted.crossCheck, meter)));
  } else {
    meter.spend(converted.attitudes, '/attitudes');
    meterWarnings(meter, converted.warnings);
    bytes = converted.output;
  }
  await record(services, call, route, 200, null);
  response.status(200).setHeader('Content-Type', contentTypeOf(output));
  response.end(bytes);
}
