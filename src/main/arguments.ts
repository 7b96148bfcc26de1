import * as v from 'valibot'
import type { Channel, ChannelMap } from '../shared/channels'

/** More text than any brief or export has; a larger one is a fault. */
const LARGEST_TEXT = 100_000_000

const text = v.pipe(v.string(), v.maxLength(LARGEST_TEXT))
const bytes = v.pipe(
  v.instance(Uint8Array),
  v.check((value) => value.byteLength <= LARGEST_TEXT, 'is too large'),
)

/** A file name without any folder: the page never says where something is written. */
const fileName = v.pipe(
  v.string(),
  v.minLength(1),
  v.maxLength(255),
  // eslint-disable-next-line no-control-regex -- control characters are what this keeps out
  v.regex(/^[^/\\:*?"<>|\u0000-\u001f]+$/, 'is not a plain file name'),
  v.check((name) => !/^\.+$/.test(name), 'is not a plain file name'),
)

const SCHEMAS = {
  openFiles: v.tuple([]),
  openBrief: v.tuple([]),
  saveBrief: v.strictTuple([text, fileName, v.boolean()]),
  forgetBrief: v.tuple([]),
  saveFile: v.strictTuple([fileName, v.union([text, bytes])]),
  saveFiles: v.strictTuple([
    v.pipe(v.array(v.strictObject({ name: fileName, text })), v.minLength(1), v.maxLength(100)),
  ]),
  recover: v.tuple([]),
  keepForRecovery: v.strictTuple([v.nullable(text)]),
  print: v.tuple([]),
  showDocument: v.strictTuple([v.pipe(v.string(), v.maxLength(1000)), v.boolean()]),
} satisfies Record<Channel, v.GenericSchema<unknown>>

/**
 * The arguments of a request, checked.
 *
 * Throws an Error that names the request when they are not what the channel map says.
 */
export function checkedArguments<K extends Channel>(
  channel: K,
  given: readonly unknown[],
): ChannelMap[K]['asks'] {
  const checked = v.safeParse(SCHEMAS[channel] as v.GenericSchema<unknown>, given)
  if (!checked.success) throw new Error(`The window asked for "${channel}" in a way that makes no sense.`)
  return checked.output as ChannelMap[K]['asks']
}
