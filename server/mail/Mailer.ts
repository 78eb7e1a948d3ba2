/** A message as plain text: everybody can read it, and nothing in it can be dressed up. */
export interface Message {
  to: string;
  subject: string;
  text: string;
}

export interface Mailer {
  /** Rejects when the message was not taken. */
  send: (message: Message) => Promise<void>;
  close: () => void;
}
