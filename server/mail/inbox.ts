/** A letter as it arrived in the inbox of development. */
export interface ReceivedLetter {
  recipients: string[];
  messageId: string;
  subject: string;
  text: string;
  html: string;
  headerNames: string[];
  /** All of them as they came. */
  headers: string;
}

export interface DevInbox {
  smtpUrl: string;
  /** Newest first. */
  letters(): readonly ReceivedLetter[];
  close(): Promise<void>;
}
