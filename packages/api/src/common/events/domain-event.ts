/** One fact that has happened. Its class names the topic on which it is published after the commit. */
export abstract class DomainEvent {
  static readonly topic: string;

  get topic(): string {
    return (this.constructor as typeof DomainEvent).topic;
  }
}
