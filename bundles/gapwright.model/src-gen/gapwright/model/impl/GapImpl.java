/**
 */
package gapwright.model.impl;

import gapwright.model.Fringing;
import gapwright.model.Gap;
import gapwright.model.GapPlace;
import gapwright.model.GapwrightPackage;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Gap</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.GapImpl#getLength <em>Length</em>}</li>
 *   <li>{@link gapwright.model.impl.GapImpl#getPieces <em>Pieces</em>}</li>
 *   <li>{@link gapwright.model.impl.GapImpl#getFringing <em>Fringing</em>}</li>
 *   <li>{@link gapwright.model.impl.GapImpl#getWindowHeight <em>Window Height</em>}</li>
 *   <li>{@link gapwright.model.impl.GapImpl#getPosition <em>Position</em>}</li>
 *   <li>{@link gapwright.model.impl.GapImpl#getPlace <em>Place</em>}</li>
 * </ul>
 *
 * @generated
 */
public class GapImpl extends ElementImpl implements Gap {
	/**
	 * The default value of the '{@link #getLength() <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLength()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity LENGTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getLength() <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLength()
	 * @generated
	 * @ordered
	 */
	protected Quantity length = LENGTH_EDEFAULT;

	/**
	 * The default value of the '{@link #getPieces() <em>Pieces</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPieces()
	 * @generated
	 * @ordered
	 */
	protected static final int PIECES_EDEFAULT = 1;

	/**
	 * The cached value of the '{@link #getPieces() <em>Pieces</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPieces()
	 * @generated
	 * @ordered
	 */
	protected int pieces = PIECES_EDEFAULT;

	/**
	 * The default value of the '{@link #getFringing() <em>Fringing</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFringing()
	 * @generated
	 * @ordered
	 */
	protected static final Fringing FRINGING_EDEFAULT = Fringing.NONE;

	/**
	 * The cached value of the '{@link #getFringing() <em>Fringing</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFringing()
	 * @generated
	 * @ordered
	 */
	protected Fringing fringing = FRINGING_EDEFAULT;

	/**
	 * The default value of the '{@link #getWindowHeight() <em>Window Height</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWindowHeight()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity WINDOW_HEIGHT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getWindowHeight() <em>Window Height</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getWindowHeight()
	 * @generated
	 * @ordered
	 */
	protected Quantity windowHeight = WINDOW_HEIGHT_EDEFAULT;

	/**
	 * The default value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected static final double POSITION_EDEFAULT = 0.5;

	/**
	 * The cached value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected double position = POSITION_EDEFAULT;

	/**
	 * The default value of the '{@link #getPlace() <em>Place</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPlace()
	 * @generated
	 * @ordered
	 */
	protected static final GapPlace PLACE_EDEFAULT = GapPlace.WITHIN_LEG;

	/**
	 * The cached value of the '{@link #getPlace() <em>Place</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPlace()
	 * @generated
	 * @ordered
	 */
	protected GapPlace place = PLACE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected GapImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.GAP;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getLength() {
		return length;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLength(Quantity newLength) {
		Quantity oldLength = length;
		length = newLength;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.GAP__LENGTH, oldLength, length));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getPieces() {
		return pieces;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPieces(int newPieces) {
		int oldPieces = pieces;
		pieces = newPieces;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.GAP__PIECES, oldPieces, pieces));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Fringing getFringing() {
		return fringing;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFringing(Fringing newFringing) {
		Fringing oldFringing = fringing;
		fringing = newFringing == null ? FRINGING_EDEFAULT : newFringing;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.GAP__FRINGING, oldFringing, fringing));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getWindowHeight() {
		return windowHeight;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setWindowHeight(Quantity newWindowHeight) {
		Quantity oldWindowHeight = windowHeight;
		windowHeight = newWindowHeight;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.GAP__WINDOW_HEIGHT, oldWindowHeight, windowHeight));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getPosition() {
		return position;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPosition(double newPosition) {
		double oldPosition = position;
		position = newPosition;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.GAP__POSITION, oldPosition, position));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public GapPlace getPlace() {
		return place;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPlace(GapPlace newPlace) {
		GapPlace oldPlace = place;
		place = newPlace == null ? PLACE_EDEFAULT : newPlace;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.GAP__PLACE, oldPlace, place));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.GAP__LENGTH:
				return getLength();
			case GapwrightPackage.GAP__PIECES:
				return getPieces();
			case GapwrightPackage.GAP__FRINGING:
				return getFringing();
			case GapwrightPackage.GAP__WINDOW_HEIGHT:
				return getWindowHeight();
			case GapwrightPackage.GAP__POSITION:
				return getPosition();
			case GapwrightPackage.GAP__PLACE:
				return getPlace();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.GAP__LENGTH:
				setLength((Quantity)newValue);
				return;
			case GapwrightPackage.GAP__PIECES:
				setPieces((Integer)newValue);
				return;
			case GapwrightPackage.GAP__FRINGING:
				setFringing((Fringing)newValue);
				return;
			case GapwrightPackage.GAP__WINDOW_HEIGHT:
				setWindowHeight((Quantity)newValue);
				return;
			case GapwrightPackage.GAP__POSITION:
				setPosition((Double)newValue);
				return;
			case GapwrightPackage.GAP__PLACE:
				setPlace((GapPlace)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.GAP__LENGTH:
				setLength(LENGTH_EDEFAULT);
				return;
			case GapwrightPackage.GAP__PIECES:
				setPieces(PIECES_EDEFAULT);
				return;
			case GapwrightPackage.GAP__FRINGING:
				setFringing(FRINGING_EDEFAULT);
				return;
			case GapwrightPackage.GAP__WINDOW_HEIGHT:
				setWindowHeight(WINDOW_HEIGHT_EDEFAULT);
				return;
			case GapwrightPackage.GAP__POSITION:
				setPosition(POSITION_EDEFAULT);
				return;
			case GapwrightPackage.GAP__PLACE:
				setPlace(PLACE_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.GAP__LENGTH:
				return LENGTH_EDEFAULT == null ? length != null : !LENGTH_EDEFAULT.equals(length);
			case GapwrightPackage.GAP__PIECES:
				return pieces != PIECES_EDEFAULT;
			case GapwrightPackage.GAP__FRINGING:
				return fringing != FRINGING_EDEFAULT;
			case GapwrightPackage.GAP__WINDOW_HEIGHT:
				return WINDOW_HEIGHT_EDEFAULT == null ? windowHeight != null : !WINDOW_HEIGHT_EDEFAULT.equals(windowHeight);
			case GapwrightPackage.GAP__POSITION:
				return position != POSITION_EDEFAULT;
			case GapwrightPackage.GAP__PLACE:
				return place != PLACE_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (length: ");
		result.append(length);
		result.append(", pieces: ");
		result.append(pieces);
		result.append(", fringing: ");
		result.append(fringing);
		result.append(", windowHeight: ");
		result.append(windowHeight);
		result.append(", position: ");
		result.append(position);
		result.append(", place: ");
		result.append(place);
		result.append(')');
		return result.toString();
	}

} //GapImpl
