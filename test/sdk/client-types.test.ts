import {
  type AnswerOf,
  type Client,
  createClient,
  type FormOf,
  type OperationId,
  type RequestOf,
  type Schema,
} from "@rodset/sdk";
import { describe, expect, expectTypeOf, it } from "vitest";
import { OPERATIONS } from "../../sdk/src/generated/operations.ts";

const client = createClient({ baseUrl: "http://127.0.0.1:1" });
const rodSet = { fieldRadius_mm: 4, frequency_MHz: 1.2 };
const rf = { volts: 1663.4998, as: "zero-to-peak", between: "pole-and-ground" } as const;

describe("the client's types", () => {
  it("have one method, never optional and never any, for each operation of the document", () => {
    expectTypeOf<keyof Client>().toEqualTypeOf<OperationId | "form">();
    expectTypeOf<undefined extends Client[keyof Client] ? true : false>().toEqualTypeOf<false>();
    expectTypeOf<{ [Id in OperationId]: Any<AnswerOf<Id>> }[OperationId]>().toEqualTypeOf<false>();
    expectTypeOf<{ [Id in OperationId]: Any<RequestOf<Id>> }[OperationId]>().toEqualTypeOf<false>();
    expectTypeOf<
      { [Id in OperationId]: [AnswerOf<Id>] extends [never] ? Id : never }[OperationId]
    >().toBeNever();
    expect(Object.keys(client).sort()).toEqual([...Object.keys(OPERATIONS), "form"].sort());
  });

  it("take exactly the request of the operation and give exactly its answer", () => {
    expectTypeOf(client.passband).parameter(0).toEqualTypeOf<Schema<"PassbandRequest">>();
    expectTypeOf(client.passband).returns.resolves.toEqualTypeOf<Schema<"PassbandAnswer">>();
    expectTypeOf(client.stability).returns.resolves.toEqualTypeOf<Schema<"StabilityAnswer">>();
    expectTypeOf<RequestOf<"about">>().toBeNever();
  });

  it("know which media types an answer has beside JSON", () => {
    expectTypeOf<FormOf<"signOffChecks">>().toEqualTypeOf<"text/markdown">();
    expectTypeOf<FormOf<"stabilityRegions">>().toEqualTypeOf<"image/svg+xml">();
    expectTypeOf<FormOf<"passband">>().toBeNever();
  });

  it("refuse at compile time what the service would refuse", () => {
    // Never called: tsc is the test, and an error that no longer occurs is an error.
    void (async () => {
      await client.passband({ rodSet, drive: { rf } });
      // @ts-expect-error a voltage without its convention
      await client.passband({ rodSet, drive: { rf: { volts: 1663.4998, as: "zero-to-peak" } } });
      // @ts-expect-error a width without its height
      await client.passband({ mzCentre: 1000, width: { value: 0.7, as: "mz" } });
      // @ts-expect-error a misspelt member
      await client.passband({ rodSet: { fieldRadius_mm: 4, frequncy_MHz: 1.2 }, drive: { rf } });
      // @ts-expect-error a request is missing
      await client.passband();
      // @ts-expect-error an operation that takes nothing
      await client.about({ rodSet });
      await client.stabilityRegions({ aMin: 0, qMax: 1 });
      // @ts-expect-error a misspelt parameter of a query
      await client.stabilityRegions({ aLow: 0 });
      // @ts-expect-error there is no such operation
      await client.passbands({ rodSet, drive: { rf } });
      // @ts-expect-error a media type that the operation does not answer in
      await client.form("passband", "text/html", { rodSet, drive: { rf } });
      const { passbands } = await client.passband({ rodSet, drive: { rf } }, { timeout_ms: 1 });
      // @ts-expect-error the high edge is unbounded without DC, which the type says
      passbands[0]!.mzHigh.toFixed();
      // @ts-expect-error there may be no passband
      passbands[0].mzLow.toFixed();
    });
  });
});

type Any<Type> = 0 extends 1 & Type ? true : false;
