import { success } from '../../core'
import type { Channel, Id, Reading, Sheet } from '../types'
import { type Change, withChange } from './change'
import type { EditKind } from './edit-kind'
import { entryOf, orNone, withAdded, withReplaced } from './lists'

/** Adds a channel after the others: a CT, VT, probe or clamp that several readings share. */
export interface AddChannel {
  readonly kind: 'add-channel'
  readonly channel: Channel
}

/** Changes a channel; null takes a field away. */
export interface SetChannel {
  readonly kind: 'set-channel'
  readonly id: Id
  readonly change: Omit<Change<Channel>, 'id'>
}

/** Removes a channel; the readings through it stay, as if they had been taken without it. */
export interface RemoveChannel {
  readonly kind: 'remove-channel'
  readonly id: Id
}

/** Adds a channel. */
export const addChannel: EditKind<AddChannel> = {
  apply: (sheet, { channel }) => success(withAdded(sheet, 'channels', [channel])),
  describe: (_, { channel }) => `Add the channel ${channel.label ?? channel.id}`,
}

/** Changes a channel. */
export const setChannel: EditKind<SetChannel> = {
  apply: (sheet, { id, change }) => {
    const found = entryOf(sheet, 'channels', id)
    if (!found.ok) return found
    return success(withReplaced(sheet, 'channels', withChange<Channel>(found.value, change)))
  },
  describe: (sheet, { id }) => `Change the channel ${nameOfChannel(sheet, id)}`,
}

/** Removes a channel. */
export const removeChannel: EditKind<RemoveChannel> = {
  apply: (sheet, { id }) => {
    const found = entryOf(sheet, 'channels', id)
    if (!found.ok) return found
    const left = (sheet.channels ?? []).filter((channel) => channel.id !== id)
    const readings = (sheet.readings ?? []).map((reading) => withoutChannel(reading, id))
    return success(withChange<Sheet>(sheet, { channels: orNone(left), readings: orNone(readings) }))
  },
  describe: (sheet, { id }) => `Delete the channel ${nameOfChannel(sheet, id)}`,
}

function withoutChannel(reading: Reading, id: Id): Reading {
  const own = reading.channel === id ? { channel: null } : {}
  const current =
    'currentChannel' in reading && reading.currentChannel === id ? { currentChannel: null } : {}
  return withChange<Reading>(reading, { ...own, ...current })
}

/** How a channel is called in a sentence: its label, or its id where it has none. */
export function nameOfChannel(sheet: Sheet, id: Id): string {
  return (sheet.channels ?? []).find((channel) => channel.id === id)?.label ?? id
}
