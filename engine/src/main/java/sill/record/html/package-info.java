/**
 * A record as one HTML file: {@link sill.record.html.RecordPage#write} is the way in. The file needs no network and no
 * script, and carries the record's JSON, so that it can be run again. Each class below writes one part of the sheet.
 */
package sill.record.html;
