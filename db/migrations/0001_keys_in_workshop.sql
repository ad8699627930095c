ALTER TABLE "artefact" DROP CONSTRAINT "artefact_revision_id_revision_id_fk";
--> statement-breakpoint
ALTER TABLE "artefact" ADD CONSTRAINT "artefact_revision_id_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revision"("id") ON DELETE restrict ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "design" ADD CONSTRAINT "design_in_workshop" UNIQUE("id","workshop_id");--> statement-breakpoint
ALTER TABLE "revision" ADD CONSTRAINT "revision_in_design" UNIQUE("id","design_id");