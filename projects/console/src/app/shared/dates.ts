import { Pipe, type PipeTransform } from '@angular/core';

const dayFormat = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
});
const clock = new Intl.DateTimeFormat('en-GB', {
  hour: '2-digit',
  minute: '2-digit',
  second: '2-digit',
  fractionalSecondDigits: 3,
  hourCycle: 'h23',
});
const shortClock = new Intl.DateTimeFormat('en-GB', {
  hour: '2-digit',
  minute: '2-digit',
  hourCycle: 'h23',
});

export const zone = (): string => Intl.DateTimeFormat().resolvedOptions().timeZone;

/** `31 Jan 2026`. A bare date is that day, wherever the reader is. */
export const dayOf = (moment: string | Date): string =>
  dayFormat.format(
    typeof moment === 'string' && moment.length === 10
      ? new Date(`${moment}T12:00`)
      : new Date(moment),
  );

/** `14:02:11.482` */
export const timeOf = (moment: string | Date): string => clock.format(new Date(moment));

/** `31 Jan 2026, 14:02` */
export const momentOf = (moment: string | Date): string =>
  `${dayOf(moment)}, ${shortClock.format(new Date(moment))}`;

@Pipe({ name: 'day' })
export class DayPipe implements PipeTransform {
  transform(moment: string | Date | null | undefined): string {
    return moment ? dayOf(moment) : '–';
  }
}

@Pipe({ name: 'clock' })
export class ClockPipe implements PipeTransform {
  transform(moment: string): string {
    return timeOf(moment);
  }
}
