/**
 * Progress and cancellation handles, and the runner of background work. Imports nothing of the
 * project.
 */
package loopwright.task;
