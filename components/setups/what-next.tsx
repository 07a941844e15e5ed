import Link from 'next/link'

interface Props {
  changePath: string
  /** The same preamp, arm and amplifier with another cartridge. */
  anotherCartridgePath: string
}

export function WhatNext({ changePath, anotherCartridgePath }: Props) {
  return (
    <section className="nxt no-p" aria-label="What next">
      <div>
        <h3>Something not right in it?</h3>
        <p>Change an answer. The sheet keeps its number and gets a new letter.</p>
        <Link href={changePath}>Change an answer</Link>
      </div>
      <div>
        <h3>Trying another cartridge?</h3>
        <p>Preamp, arm and amplifier stay as they are here. Only the cartridge is asked again.</p>
        <Link href={anotherCartridgePath}>Start from this sheet</Link>
      </div>
      <div>
        <h3>Another preamp?</h3>
        <p>Begin with nothing filled in.</p>
        <Link href="/check">Check a cartridge</Link>
      </div>
    </section>
  )
}
