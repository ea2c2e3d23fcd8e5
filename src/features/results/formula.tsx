import { type FormulaNode, parseFormula } from './formula-tree'

/** A formula typeset from its plain text; screen readers get the plain text. */
export function Formula({ text, className = '' }: { text: string; className?: string }) {
  return (
    <span role="math" aria-label={text} className={`inline-flex flex-wrap items-center ${className}`}>
      <span aria-hidden="true" className="inline-flex flex-wrap items-center">
        <FormulaPart node={parseFormula(text)} />
      </span>
    </span>
  )
}

/** Symbols of one or two letters stand italic; words, functions, numbers and marks upright. */
const UPRIGHT =
  /^(?:of|is|at|on|to|in|by|no|or|if|ln|lg|and|the|its|for|max|min|sin|cos|tan|log|exp|det|sum)$/i
const isSymbol = (text: string) => /^\p{L}/u.test(text) && [...text].length <= 3 && !UPRIGHT.test(text)

function FormulaPart({ node }: { node: FormulaNode }) {
  switch (node.kind) {
    case 'text':
      return <span className={`whitespace-pre ${isSymbol(node.text) ? 'italic' : ''}`}>{node.text}</span>
    case 'row':
      return node.items.map((item, index) => <FormulaPart key={index} node={item} />)
    case 'scripted':
      return (
        <span className="inline-flex items-center">
          <FormulaPart node={node.base} />
          <span className="inline-flex flex-col justify-center text-[0.72em] leading-[1.05]">
            {node.sup !== null && (
              <sup
                className={`text-[1em] leading-none ${node.sub === null ? '-translate-y-[0.55em]' : '-translate-y-[0.1em]'} static inline-flex`}
              >
                <FormulaPart node={node.sup} />
              </sup>
            )}
            {node.sub !== null && (
              <sub
                className={`text-[1em] leading-none ${node.sup === null ? 'translate-y-[0.5em]' : 'translate-y-[0.1em]'} static inline-flex not-italic`}
              >
                <FormulaPart node={node.sub} />
              </sub>
            )}
          </span>
        </span>
      )
    case 'fraction':
      return (
        <span className="mx-0.5 inline-flex flex-col items-stretch align-middle leading-tight">
          <span className="inline-flex items-center justify-center px-1 pb-0.5">
            <FormulaPart node={node.above} />
          </span>
          <span className="inline-flex items-center justify-center border-t border-ink px-1 pt-0.5">
            <FormulaPart node={node.below} />
          </span>
        </span>
      )
    case 'root':
      return (
        <span className="inline-flex items-stretch">
          <span className="flex items-center text-[1.2em] leading-none">√</span>
          <span className="inline-flex items-center border-t border-ink px-0.5 pt-0.5">
            <FormulaPart node={node.content} />
          </span>
        </span>
      )
    case 'group':
      return (
        <>
          <Bracket isTall={isTall(node.content)}>(</Bracket>
          <FormulaPart node={node.content} />
          <Bracket isTall={isTall(node.content)}>)</Bracket>
        </>
      )
  }
}

/** Brackets around a fraction grow with it. */
const isTall = (node: FormulaNode): boolean =>
  node.kind === 'fraction' || (node.kind === 'row' && node.items.some(isTall))

function Bracket({ isTall: grows, children }: { isTall: boolean; children: string }) {
  return <span className={grows ? 'scale-x-75 text-[2em] leading-none font-light' : ''}>{children}</span>
}
