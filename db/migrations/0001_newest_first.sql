DROP INDEX "sign_ins_user";--> statement-breakpoint
DROP INDEX "jobs_workspace";--> statement-breakpoint
DROP INDEX "api_keys_workspace";--> statement-breakpoint
DROP INDEX "mail_at";--> statement-breakpoint
DROP INDEX "changes_workspace";--> statement-breakpoint
DROP INDEX "changes_study";--> statement-breakpoint
DROP INDEX "studies_list";--> statement-breakpoint
DROP INDEX "audit_log_workspace";--> statement-breakpoint
CREATE INDEX "sign_ins_user" ON "sign_ins" USING btree ("user_id","created_at" DESC NULLS FIRST);--> statement-breakpoint
CREATE INDEX "jobs_workspace" ON "jobs" USING btree ("workspace_id","created_at" DESC NULLS FIRST,"id" DESC NULLS FIRST);--> statement-breakpoint
CREATE INDEX "api_keys_workspace" ON "api_keys" USING btree ("workspace_id","created_at" DESC NULLS FIRST);--> statement-breakpoint
CREATE INDEX "mail_at" ON "mail" USING btree ("at" DESC NULLS FIRST);--> statement-breakpoint
CREATE INDEX "changes_workspace" ON "changes" USING btree ("workspace_id","at" DESC NULLS FIRST);--> statement-breakpoint
CREATE INDEX "changes_study" ON "changes" USING btree ("study_id","at" DESC NULLS FIRST,"id" DESC NULLS FIRST);--> statement-breakpoint
CREATE INDEX "studies_list" ON "studies" USING btree ("workspace_id","updated_at" DESC NULLS FIRST,"id" DESC NULLS FIRST) WHERE "studies"."deleted_at" is null;--> statement-breakpoint
CREATE INDEX "audit_log_workspace" ON "audit_log" USING btree ("workspace_id","at" DESC NULLS FIRST,"id" DESC NULLS FIRST);