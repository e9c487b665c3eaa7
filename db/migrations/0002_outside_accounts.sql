-- Where units come from and go to outside the loop (RULES 1): one account each.
INSERT INTO `accounts` (`kind`) VALUES ('bought'), ('scrapped'), ('lost'), ('found'), ('opening');
