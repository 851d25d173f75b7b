/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Winding</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Coils in series, carrying one current.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Winding#getCoils <em>Coils</em>}</li>
 *   <li>{@link gapwright.model.Winding#getWire <em>Wire</em>}</li>
 *   <li>{@link gapwright.model.Winding#getResistance <em>Resistance</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getWinding()
 * @model
 * @generated
 */
public interface Winding extends Element {
	/**
	 * Returns the value of the '<em><b>Coils</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.Coil}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Coils</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getWinding_Coils()
	 * @model containment="true"
	 * @generated
	 */
	EList<Coil> getCoils();

	/**
	 * Returns the value of the '<em><b>Wire</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Conductor: a gauge number or a bare diameter.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Wire</em>' attribute.
	 * @see #setWire(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWinding_Wire()
	 * @model dataType="gapwright.model.Wire"
	 * @generated
	 */
	Quantity getWire();

	/**
	 * Sets the value of the '{@link gapwright.model.Winding#getWire <em>Wire</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Wire</em>' attribute.
	 * @see #getWire()
	 * @generated
	 */
	void setWire(Quantity value);

	/**
	 * Returns the value of the '<em><b>Resistance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Measured or required resistance at 20 °C, in place of the one reckoned from the wire.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Resistance</em>' attribute.
	 * @see #setResistance(Quantity)
	 * @see gapwright.model.GapwrightPackage#getWinding_Resistance()
	 * @model dataType="gapwright.model.Resistance"
	 * @generated
	 */
	Quantity getResistance();

	/**
	 * Sets the value of the '{@link gapwright.model.Winding#getResistance <em>Resistance</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Resistance</em>' attribute.
	 * @see #getResistance()
	 * @generated
	 */
	void setResistance(Quantity value);

} // Winding
