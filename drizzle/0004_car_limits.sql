-- Twenty cars a member (CARS_AT_MOST in shared/cars/car.ts). The member's row is locked first, so that two cars that come at
-- the same time are counted one after the other.
CREATE FUNCTION refuse_too_many_cars() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM 1 FROM members WHERE id = NEW.member_id FOR NO KEY UPDATE;
  IF (SELECT count(*) FROM cars WHERE member_id = NEW.member_id) >= 20 THEN
    RAISE EXCEPTION 'a member keeps at most 20 cars' USING ERRCODE = 'check_violation', CONSTRAINT = 'cars_at_most_20';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER cars_at_most_20 BEFORE INSERT ON "cars" FOR EACH ROW EXECUTE FUNCTION refuse_too_many_cars();
