/**
 * One answer without instruments: each kind is a command that fills an {@link
 * tunwarden.app.reckon.AnswerSheet}, printed as text or JSON.
 */
package tunwarden.app.reckon;
