import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { duplicateMembers } from "../../services/http/duplicate-members.ts";

const pointers = (text: string) => duplicateMembers(text).map(({ pointer }) => pointer);

describe("members that an object names twice", () => {
  it("are found wherever they stand", () => {
    expect(pointers('{"a":1,"a":1}')).toEqual(["/a"]);
    expect(pointers('[{"a":1},{"a":{"b":[0,{"c":1,"d":[],"c":2}]}}]')).toEqual(["/1/a/b/1/c"]);
    expect(pointers('{"a":{"a":1},"b":{"a":1}}')).toEqual([]);
    expect(pointers('["a","a",{"a":"a"},"a"]')).toEqual([]);
    expect(pointers('{"a/b":{"":1,"":2}}')).toEqual(["/a~1b/"]);
  });

  it("are the same in whichever way their names are written (RFC 8259, section 8.3)", () => {
    expect(pointers(String.raw`{"a\\b":1,"a\u005Cb":2}`)).toEqual(["/a\\b"]);
    expect(pointers(String.raw`{"\ud83d\ude00":1,"😀":2}`)).toEqual(["/😀"]);
  });

  it("are not looked for in texts", () => {
    expect(pointers(String.raw`{"a":"{\"b\":1,\"b\":2}","c":"/* \"a\": */"}`)).toEqual([]);
  });

  it("are told once for each time too many, and the name that readers treat differently with them", () => {
    expect(pointers('{"a":1,"a":2,"a":3}')).toEqual(["/a", "/a"]);
    expect(pointers('{"result":{"__proto__":{}}}')).toEqual(["/result/__proto__"]);
  });

  it("are told up to a hundred times, and a long name not at all", () => {
    expect(pointers(`{${'"a":1,'.repeat(5000)}"a":1}`)).toHaveLength(100);
    const name = "x".repeat(61);
    expect(pointers(`{"a":{"${name}":1,"${name}":2}}`)).toEqual(["/a"]);
  });

  it("are found below any number of brackets", () => {
    const deep = 200_000;
    expect(pointers(`${"[".repeat(deep)}{"a":1,"a":2}${"]".repeat(deep)}`)).toHaveLength(1);
  });

  it("are in no document that came out of a serializer, however it is spaced", () => {
    const spaces = fc.constantFrom(undefined, 1, "\t");
    fc.assert(
      fc.property(fc.jsonValue(), spaces, (value, space) => {
        const text = JSON.stringify(value, null, space);
        if (text.includes('"__proto__"')) return;
        expect(duplicateMembers(text)).toEqual([]);
      }),
    );
  });

  it("are found when one is planted into any object", () => {
    fc.assert(
      fc.property(fc.jsonValue(), fc.string(), fc.jsonValue(), (value, name, twice) => {
        const member = `${JSON.stringify(name)}:${JSON.stringify(value)}`;
        const text = `[0,{${member},${JSON.stringify(name)}:${JSON.stringify(twice)}}]`;
        expect(duplicateMembers(text).length).toBeGreaterThan(0);
      }),
    );
  });
});
