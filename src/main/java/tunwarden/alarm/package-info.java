/** Alarms by ISA-18.2, as a fold over assessments: same assessments, same alarms. */
package tunwarden.alarm;
