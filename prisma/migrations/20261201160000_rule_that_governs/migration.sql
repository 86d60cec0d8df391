-- The rule that governed a demand, where several compete.
ALTER TABLE "demand" ADD COLUMN "governs" TEXT;
