/**
 * Sends word of alarms to people who are not there: a command, e-mail, a webhook. Every message
 * waits on disk until it was delivered; a channel that hangs holds up nobody.
 */
package tunwarden.notice;
