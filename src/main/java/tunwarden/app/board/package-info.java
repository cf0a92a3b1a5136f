/** Behind the dashboard: keeps the board that it draws and carries out what it asks for. */
package tunwarden.app.board;
