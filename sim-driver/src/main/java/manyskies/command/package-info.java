/**
 * The command line: parse, call one service, print, return an exit code.
 *
 * <p><b>In</b>: arguments. <b>Out</b>: text, files, an {@link manyskies.command.ExitCode}.
 *
 * <p><b>Flow</b>: Main builds the commands on Services; each command reads its files, does its job
 * through farm, aggregate and realisation, and prints. Failures alone turns exceptions into
 * sentences and exit codes. Only run starts Spark, and only if blocks are missing.
 *
 * <p><b>To add a command</b>: a class like EstimatorsCommand, a line in ManyskiesCommand, a test that
 * runs the command line. <b>Uses</b> everything; alone imports picocli.
 */
package manyskies.command;
