/**
 * Files, tables and pasted text to {@link soakline.specimen.Run}: the only reader of CSV and of spreadsheets. A
 * {@link soakline.intake.Table} gives facts and rows of cells, whatever it came from; {@link soakline.intake.RunTable} makes
 * runs of them.
 */
package soakline.intake;
