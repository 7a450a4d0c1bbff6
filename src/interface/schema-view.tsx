import { JumpLink } from '../ui/jump-link.tsx';
import type { JsonSchema } from './document.schema.ts';
import { objectIn, sayKind, shapesIn } from './say-schema.ts';

export const shapeId = (name: string) => `shape-${name}`;

/** A kind of value in words; the shapes that it names lead to where they are told. */
function Kind({ schema }: { schema: JsonSchema }) {
  const words = sayKind(schema);
  const shapes = shapesIn(schema);
  if (shapes.length === 0) return words;
  const pattern = new RegExp(`\\b(${shapes.join('|')})\\b`);
  return words.split(pattern).map((piece, index) =>
    shapes.includes(piece) ? (
      <JumpLink key={index} to={shapeId(piece)} className="text-woad">
        {piece}
      </JumpLink>
    ) : (
      piece
    ),
  );
}

/** What a body or an answer consists of: its kind, and its fields with theirs. */
export function SchemaView({ schema }: { schema: JsonSchema }) {
  const object = objectIn(schema);
  return (
    <>
      {schema.properties === undefined && (
        <p className="[overflow-wrap:anywhere]">
          <Kind schema={schema} />
        </p>
      )}
      {object !== null && <Fields object={object} />}
    </>
  );
}

function Fields({ object }: { object: JsonSchema }) {
  const fields = Object.entries(object.properties ?? {});
  if (fields.length === 0) return <p className="text-ink-2">An empty object.</p>;
  return (
    <ul className="border-l border-rule pl-4">
      {fields.map(([name, schema]) => {
        const inner = objectIn(schema);
        const isNeeded = object.required?.includes(name) ?? false;
        return (
          <li key={name} className="py-1 [overflow-wrap:anywhere]">
            <code className="font-sans font-semibold">{name}</code>{' '}
            <span className="text-ink-2">
              <Kind schema={schema} />
              {!isNeeded && ', may be left out'}
            </span>
            {inner !== null && <Fields object={inner} />}
          </li>
        );
      })}
    </ul>
  );
}
