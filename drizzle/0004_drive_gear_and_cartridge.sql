ALTER TABLE "unit" ADD COLUMN "dryer_cartridge_changed_on" date;--> statement-breakpoint
ALTER TABLE "fit" ADD COLUMN "drive_gear" text;