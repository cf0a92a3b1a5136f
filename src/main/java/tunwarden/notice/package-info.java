/** Sending word: command hook, e-mail, webhook. */
package tunwarden.notice;
