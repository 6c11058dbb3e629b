delete from import_upload;
delete from visit;
delete from child;
delete from account_role;
delete from account;
insert into account (version, name, display_name, password_hash, closed) values (0, 'robot', 'Robot', '{noop}open', false);
insert into account (version, name, display_name, password_hash, closed) values (0, 'clerk', 'Clerk', '{noop}open', false);
insert into account_role (account_id, role) select id, 'MACHINE' from account where name = 'robot';
insert into account_role (account_id, role) select id, 'STAFF' from account where name = 'clerk';
