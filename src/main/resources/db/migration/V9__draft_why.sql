-- The reason for a correction is kept with the text of the fields: while it is typed it may be longer than it may be stored.
alter table draft drop column why;
