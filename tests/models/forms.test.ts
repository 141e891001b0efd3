import { describe, expect, it } from "vitest";
import { pretendApp } from "../ui/pretend-app.ts";

describe("forms", () => {
  it("keep what is typed for the next link while the one before is still being stored", async () => {
    const { models, store } = pretendApp("#/rig");
    const { rig } = models;
    rig.name.set("Lead vocal");
    rig.frequency.set("606,125");
    const storing = rig.save();
    rig.name.set("Guitar pack");
    expect(await storing).toBe(true);
    expect(rig.name.text.value).toBe("Guitar pack");
    expect(await rig.save()).toBe(true);
    expect(rig.links.value.map(({ name }) => name)).toEqual(["Lead vocal", "Guitar pack"]);
    expect(store.rows.filter(({ type }) => type === "link.set")).toHaveLength(2);
  });

  it("keep a note that is begun while the one before is still being stored", async () => {
    const { models } = pretendApp("#/log");
    models.show.name.set("Lantern Parade");
    await models.show.save();
    models.log.note.set("first");
    const storing = models.log.addNote();
    models.log.note.set("second");
    await storing;
    expect(models.log.note.text.value).toBe("second");
    await models.log.addNote();
    const notes = models.log.show.value?.timeline.flatMap(({ record }) =>
      record.type === "note.added" ? [record.body.text] : [],
    );
    expect(notes).toEqual(["first", "second"]);
  });

  it("leave the show's name as it is when only its place is typed", async () => {
    const { models } = pretendApp("#/show");
    models.show.name.set("Lantern Parade");
    await models.show.save();
    models.show.place.set("Old Ropeworks");
    await models.show.save();
    expect(models.show.open.value).toMatchObject({
      name: "Lantern Parade",
      place: "Old Ropeworks",
    });
  });

  it("refuse what is too long, and keep it to be shortened", async () => {
    const { models, store } = pretendApp("#/show");
    models.show.name.set("x".repeat(121));
    expect(await models.show.save()).toBe(false);
    expect(models.show.isTooLong.value).toBe(true);
    expect(models.show.name.text.value).toHaveLength(121);
    models.rig.name.set("y".repeat(121));
    expect(await models.rig.save()).toBe(false);
    expect(models.rig.problem.value).toBe("name-too-long");
    expect(store.rows).toEqual([]);
  });
});
