/** The sentence below a field that says why its text is refused; nothing while it is not. */
export function FieldProblem(properties: {
  readonly id: string
  readonly problem: string | undefined
}) {
  const { id, problem } = properties
  if (problem === undefined) return null
  return (
    <p className="cell-problem" id={id} role="alert">
      {problem}
    </p>
  )
}
