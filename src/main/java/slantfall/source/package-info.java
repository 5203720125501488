/** Sources and how far each is vouched for. Imports nothing of ours, so that every layer can cite. */
package slantfall.source;
