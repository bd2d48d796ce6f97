import { useAwake } from './use-awake';

/** A moment in the reader's own time; the server, which cannot know it, writes it in UTC. */
export function Moment({ at, withTime = true }: { at: string; withTime?: boolean }) {
  const here = useAwake();
  const text = new Intl.DateTimeFormat('en-GB', {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    ...(withTime ? { hour: '2-digit', minute: '2-digit' } : {}),
    ...(here ? {} : { timeZone: 'UTC' }),
  }).format(new Date(at));
  return (
    <time dateTime={at} className="whitespace-nowrap">
      {text}
      {!here && withTime ? ' UTC' : ''}
    </time>
  );
}
