/** Workbooks that are read and written: Office Open XML, up to so many bytes. */
export const WORKBOOK_MEDIA_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';
export const MOST_IMPORT_BYTES = 10 * 1_048_576;
