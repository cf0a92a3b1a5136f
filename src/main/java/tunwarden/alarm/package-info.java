/**
 * Alarms in the sense of ANSI/ISA-18.2 as a pure fold: {@link tunwarden.alarm.AlarmBook} takes one
 * assessment after the other and hands back the next book with the transitions that followed. The
 * same assessments give the same alarms, live or replayed.
 */
package tunwarden.alarm;
