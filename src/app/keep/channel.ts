/** What a page tells the others. */
export type Message =
  | {
      readonly kind: 'saved'
      readonly id: string
      readonly revision: number
      readonly text: string
    }
  | { readonly kind: 'removed' }

/** How the pages of one browser hear of each other's changes. */
export interface Channel {
  post(message: Message): void
  onMessage(listener: (message: Message) => void): () => void
}

/** The browser's own channel; where it has none, pages find out when they come to the front. */
export function createChannel(name: string): Channel {
  if (typeof BroadcastChannel === 'undefined') {
    return { post: () => undefined, onMessage: () => () => undefined }
  }
  const channel = new BroadcastChannel(name)
  return {
    post: (message) => channel.postMessage(message),
    onMessage: (listener) => {
      const onMessage = ({ data }: MessageEvent<Message>) => listener(data)
      channel.addEventListener('message', onMessage)
      return () => channel.removeEventListener('message', onMessage)
    },
  }
}
