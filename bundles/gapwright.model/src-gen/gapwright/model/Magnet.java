/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Magnet</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A permanent magnet across a leg, linear on its recoil line. Not reversed, it drives flux from from to to.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Magnet#getLength <em>Length</em>}</li>
 *   <li>{@link gapwright.model.Magnet#getRemanence <em>Remanence</em>}</li>
 *   <li>{@link gapwright.model.Magnet#getRecoilPermeability <em>Recoil Permeability</em>}</li>
 *   <li>{@link gapwright.model.Magnet#isReversed <em>Reversed</em>}</li>
 *   <li>{@link gapwright.model.Magnet#getPosition <em>Position</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getMagnet()
 * @model
 * @generated
 */
public interface Magnet extends Element {
	/**
	 * Returns the value of the '<em><b>Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Along the flux.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Length</em>' attribute.
	 * @see #setLength(Quantity)
	 * @see gapwright.model.GapwrightPackage#getMagnet_Length()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getLength();

	/**
	 * Sets the value of the '{@link gapwright.model.Magnet#getLength <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Length</em>' attribute.
	 * @see #getLength()
	 * @generated
	 */
	void setLength(Quantity value);

	/**
	 * Returns the value of the '<em><b>Remanence</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Remanence</em>' attribute.
	 * @see #setRemanence(Quantity)
	 * @see gapwright.model.GapwrightPackage#getMagnet_Remanence()
	 * @model dataType="gapwright.model.FluxDensity" required="true"
	 * @generated
	 */
	Quantity getRemanence();

	/**
	 * Sets the value of the '{@link gapwright.model.Magnet#getRemanence <em>Remanence</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Remanence</em>' attribute.
	 * @see #getRemanence()
	 * @generated
	 */
	void setRemanence(Quantity value);

	/**
	 * Returns the value of the '<em><b>Recoil Permeability</b></em>' attribute.
	 * The default value is <code>"1.05"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Relative.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Recoil Permeability</em>' attribute.
	 * @see #setRecoilPermeability(double)
	 * @see gapwright.model.GapwrightPackage#getMagnet_RecoilPermeability()
	 * @model default="1.05"
	 * @generated
	 */
	double getRecoilPermeability();

	/**
	 * Sets the value of the '{@link gapwright.model.Magnet#getRecoilPermeability <em>Recoil Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Recoil Permeability</em>' attribute.
	 * @see #getRecoilPermeability()
	 * @generated
	 */
	void setRecoilPermeability(double value);

	/**
	 * Returns the value of the '<em><b>Reversed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Reversed</em>' attribute.
	 * @see #setReversed(boolean)
	 * @see gapwright.model.GapwrightPackage#getMagnet_Reversed()
	 * @model
	 * @generated
	 */
	boolean isReversed();

	/**
	 * Sets the value of the '{@link gapwright.model.Magnet#isReversed <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reversed</em>' attribute.
	 * @see #isReversed()
	 * @generated
	 */
	void setReversed(boolean value);

	/**
	 * Returns the value of the '<em><b>Position</b></em>' attribute.
	 * The default value is <code>"0.5"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Place of its middle along the leg, as a fraction of the leg's length from its from joint.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Position</em>' attribute.
	 * @see #setPosition(double)
	 * @see gapwright.model.GapwrightPackage#getMagnet_Position()
	 * @model default="0.5"
	 * @generated
	 */
	double getPosition();

	/**
	 * Sets the value of the '{@link gapwright.model.Magnet#getPosition <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Position</em>' attribute.
	 * @see #getPosition()
	 * @generated
	 */
	void setPosition(double value);

} // Magnet
