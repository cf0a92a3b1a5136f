/** Watching, recording, alarming and serving with nobody at the screen. */
package tunwarden.app.headless;
